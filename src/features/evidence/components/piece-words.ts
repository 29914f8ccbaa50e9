import type { PieceView } from '#shared/contracts/evidence.ts';
import type { FragmentStatus, FragmentWay, OriginLies } from '#shared/vocabulary/pieces.ts';
import type { PieceShape } from '#src/ui/glyphs/piece-glyph.tsx';

/** How a piece came to be, as one chooses it. */
export const wayWords: Readonly<Record<FragmentWay, string>> = {
  break: 'broke off',
  cut: 'cut off',
  replica: 'replica of a face',
  section: 'section',
  powder: 'powder',
};

export const statusWords: Readonly<Record<FragmentStatus, string>> = {
  present: 'here',
  missing: 'not there',
  consumed: 'used up',
};

export const originWords: Readonly<Record<OriginLies, string>> = {
  no: 'no, it lies elsewhere',
  'not known': 'not known',
  yes: 'yes, it may',
};

/** The shape that stands for a piece. */
export function shapeOf({ status, way }: Pick<PieceView, 'status' | 'way'>): PieceShape {
  if (status === 'missing') return 'missing';
  if (way === 'replica' || way === 'section') return way;
  return way === 'cut' ? 'section' : 'fragment';
}

/** How deep a piece stands below its part: 1 for a piece as received, 2 for what was made from one. */
export function depthOf(piece: Pick<PieceView, 'parentId'>, pieces: readonly PieceView[]): number {
  const parent = pieces.find(({ id }) => id === piece.parentId);
  return parent ? depthOf(parent, pieces) + 1 : 1;
}

export type Remark = { readonly words: string; readonly tone: 'ink-2' | 'iron' | 'ochre' };

/** What stands in the margin of a piece: what its absence means, else how it is. */
export function remarkOf(piece: PieceView): Remark | null {
  if (piece.status === 'missing' && piece.originLies === 'yes') return { words: 'may carry the origin', tone: 'iron' };
  if (piece.status === 'missing' && piece.originLies === 'not known')
    return { words: 'origin: not known', tone: 'ochre' };
  if (piece.status === 'consumed') return { words: 'used up', tone: 'ochre' };
  return piece.condition ? { words: piece.condition, tone: 'ink-2' } : null;
}
