import type { FractographView, ScaleView, StaleView } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import type { BindingRow } from './queries/bindings.ts';
import type { FractographRow } from './queries/fractographs.ts';

type Staleness = {
  readonly why: string;
  readonly since: Date;
  readonly causeKind: string;
  readonly causeId: string;
  readonly replacedById: string | null;
};

export function presentFractograph(row: FractographRow, scale: ScaleView | null): FractographView {
  const { caseId: _case, broughtInBy, broughtInAt, fragmentId, instrumentId, ...facts } = row.fractograph;
  return {
    ...facts,
    id: facts.id as FractographId, // brand: read from the table of fractographs
    fragment: fragmentId ? { id: fragmentId, code: row.fragmentCode ?? '' } : null,
    instrument: instrumentId ? { id: instrumentId, name: row.instrumentName ?? '' } : null,
    broughtInBy: { id: broughtInBy, name: row.broughtInByName },
    broughtInAt: broughtInAt.toISOString(),
    sameBytesAs: row.sameBytesAs,
    mateId: row.mateId,
    scale,
    markCount: row.markCount,
  };
}

export function presentScale(row: BindingRow, stale: Staleness | null): ScaleView {
  const { binding, calibration } = row;
  return {
    bindingId: binding.id,
    calibrationId: calibration.id,
    code: calibration.code,
    way: calibration.way,
    pixelSizeXUm: calibration.pixelSizeXUm,
    pixelSizeYUm: calibration.pixelSizeYUm,
    relativeUncertainty: calibration.relativeUncertainty,
    source: calibration.source,
    boundBy: { id: binding.boundBy, name: row.boundByName },
    boundAt: binding.boundAt.toISOString(),
    stale: stale && presentStale(stale),
  };
}

function presentStale({ why, since, causeKind, causeId, replacedById }: Staleness): StaleView {
  return { why, since: since.toISOString(), causeKind, causeId, replacedById };
}
