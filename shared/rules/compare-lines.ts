import type { BudgetRow } from '../numeric/uncertainty/propagate.ts';
import type { EstimateLine } from '../vocabulary/estimate-lines.ts';
import { judgeAgreement, type Agreement, type LineReading, type SharedInput } from './agreement.ts';

/** An estimate as a comparison needs it. */
export type ComparedEstimate = {
  readonly line: EstimateLine;
  readonly stressMPa: number;
  readonly standardUncertaintyMPa: number;
  readonly budget: readonly Pick<BudgetRow, 'input' | 'sensitivity'>[];
  /** Inputs read off images, with the calibration each was read by. */
  readonly readings: readonly ScaledReading[];
};
export type ScaledReading = {
  readonly input: string;
  /** In the unit of the input. */
  readonly value: number;
  readonly calibrationId: string;
  /** Relative standard uncertainty of the pixel size. */
  readonly relativeUncertainty: number;
};

/** Verdict over lines in force, at most one a line. Lines read by one calibration share its scale, and are judged so. */
export function compareLines(estimates: readonly ComparedEstimate[]): Agreement {
  return judgeAgreement(
    estimates.map((estimate): LineReading => ({
      line: estimate.line,
      stressMPa: estimate.stressMPa,
      standardUncertaintyMPa: estimate.standardUncertaintyMPa,
      setAside: false,
      shared: scalesOf(estimate),
    })),
  );
}

/** One entry a calibration: what a scale off by its standard uncertainty would do to the stress, signed, MPa. */
function scalesOf(estimate: ComparedEstimate): SharedInput[] {
  const byCalibration = new Map<string, number>();
  for (const reading of estimate.readings) {
    const sensitivity = estimate.budget.find((row) => row.input === reading.input)?.sensitivity ?? 0;
    const contribution = sensitivity * reading.value * reading.relativeUncertainty;
    byCalibration.set(reading.calibrationId, (byCalibration.get(reading.calibrationId) ?? 0) + contribution);
  }
  return [...byCalibration].map(([id, contributionMPa]) => ({
    key: `calibration:${id}`,
    label: 'scale of the image',
    contributionMPa,
  }));
}
