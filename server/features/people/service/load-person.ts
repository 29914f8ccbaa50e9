import { Problem } from '../../../http/problem.ts';
import type { PersonRow } from '../queries.ts';

/** @throws Problem not-found where no account has that id */
export function loadPersonOf(row: PersonRow | null): PersonRow {
  if (!row) throw new Problem('not-found', 'There is no account under this address.');
  return row;
}
