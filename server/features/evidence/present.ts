import type { MatePairView, PartView, PieceView } from '#shared/contracts/evidence.ts';
import type { FragmentRow, MateRow, PartRow } from './queries.ts';

export function presentPart({ part, material }: PartRow): PartView {
  const { id, description, serial, drawing, maker, environment, temperatureC, serviceTime, version } = part;
  return { id, description, serial, drawing, maker, material, environment, temperatureC, serviceTime, version };
}

export function presentPiece(row: FragmentRow): PieceView {
  const { caseId: _caseId, massG, massUncertaintyG, massEntered, madeAt, ...rest } = row;
  return {
    ...rest,
    mass:
      massG === null || massUncertaintyG === null
        ? null
        : { g: massG, uncertaintyG: massUncertaintyG, entered: massEntered },
    madeAt: madeAt.toISOString(),
  };
}

/** The pieces with each one before what was made from it, in the order of their codes: F2 before F10. */
export function presentPieces(rows: readonly FragmentRow[]): PieceView[] {
  const byCode = rows
    .map(presentPiece)
    .sort((one, other) => one.code.localeCompare(other.code, 'en', { numeric: true }));
  const below = (parentId: string | null): PieceView[] =>
    byCode.filter((piece) => piece.parentId === parentId).flatMap((piece) => [piece, ...below(piece.id)]);
  return below(null);
}

export function presentMate({ mate, oneCode, otherCode, pairedBy }: MateRow): MatePairView {
  return {
    id: mate.id,
    one: { fragmentId: mate.fragmentId, code: oneCode, face: mate.face },
    other: { fragmentId: mate.mateFragmentId, code: otherCode, face: mate.mateFace },
    crack: mate.crack,
    pairedBy,
    pairedAt: mate.pairedAt.toISOString(),
    partedAt: mate.partedAt?.toISOString() ?? null,
    version: mate.version,
  };
}
