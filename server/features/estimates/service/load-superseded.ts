import { Problem } from '../../../http/problem.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { findEstimateRow, type EstimateRow } from '../queries/estimates.ts';
import type { InputReader } from './resolve-inputs.ts';

/**
 * The estimate that another is to stand in for, read inside the act.
 * @throws Problem not-found; stale-version where another already stands in for it
 */
export async function loadSuperseded({ tx, heldCase }: InputReader, id: string): Promise<EstimateRow> {
  const row = await findEstimateRow(tx, heldCase, id);
  if (!row) throw nothingHere();
  if (row.supersededById !== null) {
    throw new Problem('stale-version', `Estimate ${row.number} has been made again meanwhile.`, {
      stillHolds: 'Both are kept; nothing was lost.',
      current: { supersededById: row.supersededById },
    });
  }
  return row;
}
