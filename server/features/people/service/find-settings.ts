import type { VisitorContext } from '../../../http/context.ts';
import { findPersonById } from '../queries.ts';
import { presentPerson, presentSettings } from '../present.ts';

export async function findSettings(context: Pick<VisitorContext, 'reader'>, personId: string) {
  const row = await findPersonById(context.reader, personId);
  return row && presentSettings(row);
}

/** The person behind a session, as they stand now: a closed account is nobody. */
export async function findOpenPerson(context: Pick<VisitorContext, 'reader'>, personId: string) {
  const row = await findPersonById(context.reader, personId);
  return row?.state === 'open' ? presentPerson(row) : null;
}
