import { z } from 'zod';
import { BudgetView, OutputView, type RecomputedView } from '#shared/contracts/estimates.ts';
import { findMethod } from '#shared/numeric/methods.ts';
import { reckonEstimate, type EstimateReckoned } from '#shared/rules/reckon-estimate.ts';
import type { Reader } from '../../../database/connection.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { presentStress } from '../present/stress.ts';
import { findEstimateRowById, type EstimateRow } from '../queries/estimates.ts';
import { listInputRows } from '../queries/inputs.ts';
import { givenFrom } from './resolved-input.ts';

// Digits that two engines may differ in: the last few of a double.
const sameWithin = 1e-9;

const StoredOutputs = z.array(OutputView.pick({ name: true, value: true, standardUncertainty: true }));
const StoredBudget = z.array(BudgetView.pick({ input: true, share: true }));

/** Runs a stored estimate again by its own method version on its own inputs and compares every number to 1e-9. */
export async function recomputeEstimate(reader: Reader, id: string): Promise<RecomputedView> {
  const row = await findEstimateRowById(reader, id);
  if (!row) throw nothingHere();
  const inputs = await listInputRows(reader, [id]);
  const method = findMethod(row.method, row.methodVersion);
  const again = method ? reckonEstimate(method, givenFrom(inputs)) : null;
  const stored = presentStress(row.stressMPa, row.standardUncertaintyMPa);
  const about = { estimateId: row.id, number: row.number, stored };
  if (again?.kind !== 'value') return { ...about, same: false, largestDifference: 1, recomputed: null };
  const largestDifference = Math.max(...differences(row, again));
  const recomputed = presentStress(again.origin.value, again.origin.standardUncertainty);
  return { ...about, same: largestDifference <= sameWithin, largestDifference, recomputed };
}

function differences(row: EstimateRow, again: EstimateReckoned): number[] {
  const outputs = StoredOutputs.parse(row.outputs).flatMap((output) => {
    const now = again.outputs.find((each) => each.name === output.name);
    if (!now) return [1];
    return [relative(output.value, now.value), relative(output.standardUncertainty ?? 0, now.standardUncertainty ?? 0)];
  });
  const shares = StoredBudget.parse(row.budget).map((entry) =>
    Math.abs(entry.share - (again.budget.find((each) => each.input === entry.input)?.share ?? 1)),
  );
  return [
    relative(row.stressMPa, again.origin.value),
    relative(row.standardUncertaintyMPa, again.origin.standardUncertainty),
    ...outputs,
    ...shares,
  ];
}

function relative(stored: number, again: number): number {
  return stored === again ? 0 : Math.abs(stored - again) / Math.max(Math.abs(stored), Math.abs(again));
}
