import type { CalibrationView, InstrumentView } from '#shared/contracts/calibrations.ts';
import type { CalibrationRow, InstrumentRow } from '../queries/calibrations.ts';

export function presentInstrument({ id, name, kind }: InstrumentRow): InstrumentView {
  return { id, name, kind };
}

export function presentCalibration(row: CalibrationRow): CalibrationView {
  const { calibration } = row;
  const replaced = row.replacedById && row.replacedFrom;
  return {
    id: calibration.id,
    code: calibration.code ?? '',
    instrument: presentInstrument(row.instrument),
    setting: calibration.setting ?? '',
    way: calibration.way,
    pixelSizeXUm: calibration.pixelSizeXUm,
    pixelSizeYUm: calibration.pixelSizeYUm,
    relativeUncertainty: calibration.relativeUncertainty,
    source: calibration.source,
    asFoundErrorPercent: calibration.asFoundErrorPercent,
    validFrom: calibration.validFrom,
    reason: calibration.reason,
    madeBy: { id: calibration.madeBy, name: row.madeByName },
    madeAt: calibration.madeAt.toISOString(),
    replacedBy: replaced
      ? { id: row.replacedById ?? '', code: row.replacedByCode ?? '', validFrom: row.replacedFrom ?? '' }
      : null,
  };
}
