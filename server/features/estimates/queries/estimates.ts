import { and, asc, eq, inArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { counters } from '../../../database/tables/acts.ts';
import { estimateInputs, estimates, estimateStandings } from '../../../database/tables/estimates.ts';
import { people } from '../../../database/tables/people.ts';
import type { HeldFor } from '../../../rights/open-case.ts';

export type HeldCase = HeldFor<CaseAct>;

const follower = alias(estimates, 'follower');
const latestStanding = sql`(select s.id from estimate_standings s where s.estimate_id = ${estimates.id} order by s.made_at desc, s.id desc limit 1)`;
const standingMaker = alias(people, 'standing_maker');

export type EstimateRow = Awaited<ReturnType<typeof listEstimateRows>>[number];

/** Every estimate of the case in the order of their numbers, with what superseded it and where it stands. */
export function listEstimateRows(reader: Reader, heldCase: HeldCase) {
  return selectEstimates(reader).where(eq(estimates.caseId, heldCase.id)).orderBy(asc(estimates.number));
}

/** The same of several cases at once. */
export async function listEstimateRowsOf(reader: Reader, heldCases: readonly HeldCase[]) {
  if (heldCases.length === 0) return [];
  const ids = heldCases.map(({ id }) => id);
  return selectEstimates(reader).where(inArray(estimates.caseId, ids)).orderBy(asc(estimates.number));
}

export async function findEstimateRow(reader: Reader, heldCase: HeldCase, id: string) {
  const [row] = await selectEstimates(reader).where(and(eq(estimates.caseId, heldCase.id), eq(estimates.id, id)));
  return row ?? null;
}

/** For whoever already holds the case, or recomputes what is sealed. */
export async function findEstimateRowById(reader: Reader, id: string) {
  const [row] = await selectEstimates(reader).where(eq(estimates.id, id));
  return row ?? null;
}

function selectEstimates(reader: Reader) {
  return reader.db
    .select({
      id: estimates.id,
      caseId: estimates.caseId,
      number: estimates.number,
      line: estimates.line,
      method: estimates.method,
      methodVersion: estimates.methodVersion,
      stressMPa: estimates.stressMPa,
      standardUncertaintyMPa: estimates.standardUncertaintyMPa,
      outputs: estimates.outputs,
      budget: estimates.budget,
      cautions: estimates.cautions,
      supersedesId: estimates.supersedesId,
      supersededById: follower.id,
      remark: estimates.remark,
      madeBy: estimates.madeBy,
      madeByName: people.name,
      madeAt: estimates.madeAt,
      standing: estimateStandings.standing,
      standingReason: estimateStandings.reason,
      standingBy: estimateStandings.madeBy,
      standingByName: standingMaker.name,
      standingAt: estimateStandings.madeAt,
    })
    .from(estimates)
    .innerJoin(people, eq(people.id, estimates.madeBy))
    .leftJoin(follower, eq(follower.supersedesId, estimates.id))
    .leftJoin(estimateStandings, eq(estimateStandings.id, latestStanding))
    .leftJoin(standingMaker, eq(standingMaker.id, estimateStandings.madeBy));
}

/** The next estimate number of the case, without gap or duplicate: the counter's row is locked until the act is done. */
export async function takeEstimateNumber(tx: Transaction, heldCase: HeldCase): Promise<number> {
  const [row] = await tx.db
    .insert(counters)
    .values({ name: `estimates of ${heldCase.id}`, value: 1 })
    .onConflictDoUpdate({ target: counters.name, set: { value: sql`${counters.value} + 1` } })
    .returning({ value: counters.value });
  return row.value;
}

export async function insertEstimate(tx: Transaction, values: typeof estimates.$inferInsert) {
  const [row] = await tx.db.insert(estimates).values(values).returning({ id: estimates.id });
  return row;
}

export async function insertEstimateInputs(tx: Transaction, values: (typeof estimateInputs.$inferInsert)[]) {
  await tx.db.insert(estimateInputs).values(values);
}

export async function insertStanding(tx: Transaction, values: typeof estimateStandings.$inferInsert) {
  await tx.db.insert(estimateStandings).values(values);
}
