import type { CasebookCounts, CasebookPage, CasebookQuery } from '#shared/contracts/casebook.ts';
import type { Context } from '../../../http/context.ts';
import { countCasebook, listCasebookPage } from '../queries/casebook.ts';
import { countForTabs } from '../queries/casebook-counts.ts';
import { readingOf } from '../queries/casebook-filter.ts';
import { presentCasebookRow, presentCounts } from '../present.ts';

/** One page of the cases this person sees, each with what they may know of it. */
export async function listCasebook(context: Context, query: CasebookQuery): Promise<CasebookPage> {
  const { person, reader } = context;
  const asOf = await now(context);
  const reading = readingOf(person);
  if (reading === 'nothing') return { rows: [], total: 0, asOf: asOf.toISOString() };
  const asked = { person, query, thisYear: asOf.getUTCFullYear() };
  const [rows, total] = await Promise.all([listCasebookPage(reader, asked), countCasebook(reader, asked)]);
  return { rows: rows.map((row) => presentCasebookRow(row, reading)), total, asOf: asOf.toISOString() };
}

/** The counts behind the tabs, under the same walls. */
export async function countCases(context: Context): Promise<CasebookCounts> {
  const asOf = await now(context);
  return presentCounts(await countForTabs(context.reader, context.person, asOf.getUTCFullYear()), asOf);
}

/** The instant ages are counted to: that of the acts, which the demo and tests may set. */
function now(context: Context): Promise<Date> {
  return context.inTransaction((tx) => Promise.resolve(tx.at));
}
