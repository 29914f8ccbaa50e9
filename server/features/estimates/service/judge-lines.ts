import { z } from 'zod';
import { BudgetView } from '#shared/contracts/estimates.ts';
import type { Agreement } from '#shared/rules/agreement.ts';
import { compareLines, type ComparedEstimate } from '#shared/rules/compare-lines.ts';
import type { EstimateRow } from '../queries/estimates.ts';
import type { InputRow, ReadingSource } from '../queries/inputs.ts';
import type { WouldBe } from './would-be.ts';

const StoredBudget = z.array(BudgetView.pick({ input: true, sensitivity: true }));

/** The one estimate a line that is compared: the newest neither superseded nor set aside. Rows come by their numbers. */
export function comparedRows(rows: readonly EstimateRow[]): EstimateRow[] {
  const newest = new Map<string, EstimateRow>();
  for (const row of rows) if (isInForce(row)) newest.set(row.line, row);
  return [...newest.values()];
}

/** Neither superseded nor set aside. */
export function isInForce(row: EstimateRow): boolean {
  return row.supersededById === null && row.standing !== 'set aside';
}

/** An estimate as it was kept, for a comparison. */
export function comparedAsKept(
  row: EstimateRow,
  inputs: readonly InputRow[],
  readings: ReadonlyMap<string, ReadingSource>,
): ComparedEstimate {
  return {
    line: row.line,
    stressMPa: row.stressMPa,
    standardUncertaintyMPa: row.standardUncertaintyMPa,
    budget: StoredBudget.parse(row.budget),
    readings: inputs.flatMap(({ name, value, sourceId }) => {
      const source = readings.get(sourceId ?? '');
      if (!source) return [];
      const { calibrationId, relativeUncertainty } = source;
      return [{ input: name, value, calibrationId, relativeUncertainty }];
    }),
  };
}

/** The same as it would be from the records in force; nothing where it could not be reckoned. */
export function comparedAsWouldBe({ reckoned, inputs }: WouldBe): ComparedEstimate | null {
  if (!reckoned) return null;
  return {
    line: reckoned.line,
    stressMPa: reckoned.origin.value,
    standardUncertaintyMPa: reckoned.origin.standardUncertainty,
    budget: reckoned.budget,
    readings: inputs.flatMap(({ name, value, scale }) => (scale ? [{ input: name, value, ...scale }] : [])),
  };
}

export function judge(compared: readonly ComparedEstimate[]): Agreement {
  return compareLines(compared);
}
