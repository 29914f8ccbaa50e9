import type { Reader } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { listRoundRows, type HeldCase, type RoundRow } from '../queries/closures.ts';

/** The round of review under way. @throws Problem wrong-state where none is */
export async function loadOpenRound(reader: Reader, heldCase: HeldCase): Promise<RoundRow> {
  const round = (await listRoundRows(reader, heldCase)).at(0);
  if (!round || round.outcome !== null)
    throw new Problem('wrong-state', `${heldCase.number} is not in review; send it to review first.`);
  return round;
}
