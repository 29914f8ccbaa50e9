import type { BoundValueView } from '#shared/contracts/findings.ts';
import { may } from '#shared/rules/may.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { listOpenStaleness, settleStaleness } from '../../../lineage/settle-staleness.ts';
import { factsOf, lockCase, nothingHere, openCase, type HeldFor } from '../../../rights/open-case.ts';
import { listEstimates } from '../../estimates/service/list-estimates.ts';
import { renewEstimate } from '../../estimates/service/renew-estimate.ts';
import { readMeasurement } from '../../marks/service/read-measurement.ts';
import { findConstantNow, listBoundValueRows, listLengthSources, type BoundValueRow } from '../queries/bound-values.ts';
import { keepBinding, loadValue } from './bind-value.ts';
import { formatOf, lastOf, quantityOf } from './resolve-values.ts';

type Held = HeldFor<'write findings'>;

/**
 * Takes the new value: a new record on what stands in for the source now; the old one is superseded and settled. An
 * estimate that is itself stale is made again first, by whoever may estimate. Done already by someone, it answers with
 * what they took.
 */
export async function renewValue(context: Context, heldCase: Held, id: string): Promise<BoundValueView> {
  await renewItsEstimate(context, heldCase, id);
  // The act's own id, if an estimate was made again, is spent on that.
  const newId = await context.besideAct(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    const row = await loadNewest(tx, heldCase, id);
    if (row.id !== id) return row.id;
    const sourceId = await sourceNow(tx, context, heldCase, row);
    if (sourceId === row.sourceId) return refuseUnchanged(tx, row);
    const source = { sourceKind: row.sourceKind, sourceId, quantity: quantityOf(row) };
    const kept = { source, format: formatOf(row), act: 'value.renewed', supersedesId: row.id } as const;
    const made = await keepBinding(tx, context, heldCase, kept);
    await settleStaleness(tx, row.id, { by: context.person.id, settlement: 'taken', reason: null });
    return made;
  });
  return loadValue(context, heldCase, newId);
}

/** Keeps a stale value as it stands, and says why. @throws Problem wrong-state where it is not stale */
export async function keepOldValue(context: Context, heldCase: Held, id: string, reason: string) {
  await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    const row = (await listBoundValueRows(tx, heldCase)).find((each) => each.id === id);
    if (!row) throw nothingHere();
    const open = await listOpenStaleness(tx, [id]);
    if (open.length === 0) throw new Problem('wrong-state', 'This value is not stale.');
    await settleStaleness(tx, id, { by: context.person.id, settlement: 'kept', reason });
    await recordAct(tx, context.person, {
      act: 'stale.kept',
      inCase: heldCase,
      objectId: id,
      before: { boundValue: row.quantity, why: open.map((each) => each.why) },
      reason,
    });
  });
  return loadValue(context, heldCase, id);
}

async function refuseUnchanged(tx: Transaction, row: BoundValueRow): Promise<never> {
  const [open] = await listOpenStaleness(tx, [row.id]);
  if (!open) throw new Problem('wrong-state', 'This value is not stale: it reads what is in force.');
  throw new Problem('not-ready', `What it rests on has not been read anew yet: ${open.why}.`, {
    stillHolds: 'The value stays as it was and says that it is stale.',
  });
}

async function loadNewest(tx: Transaction, heldCase: Held, id: string): Promise<BoundValueRow> {
  const rows = await listBoundValueRows(tx, heldCase);
  const newest = (at: string): BoundValueRow => {
    const row = rows.find((each) => each.id === at);
    if (!row) throw nothingHere();
    return row.supersededById ? newest(row.supersededById) : row;
  };
  return newest(id);
}

async function renewItsEstimate(context: Context, heldCase: Held, id: string): Promise<void> {
  const row = (await listBoundValueRows(context.reader, heldCase)).find((each) => each.id === id);
  if (row?.sourceKind !== 'estimate' || row.supersededById) return;
  const { estimates } = await listEstimates(context.reader, heldCase);
  const estimate = lastOf(estimates, row.sourceId);
  if (!estimate?.stale) return;
  if (estimate.stale.hindrance) throw new Problem('not-ready', estimate.stale.hindrance);
  const answer = may(context.person, 'estimate', factsOf(heldCase));
  if (!answer.allowed)
    throw new Problem('not-ready', `Estimate ${estimate.number} is stale itself; an analyst makes it again first.`, {
      stillHolds: 'The value stays as it was and says that it is stale.',
    });
  const toEstimate = await openCase(context, CaseNumber.parse(heldCase.number), 'estimate');
  await renewEstimate(context, toEstimate, estimate.id, { remark: '' });
}

async function sourceNow(tx: Transaction, context: Context, heldCase: Held, row: BoundValueRow): Promise<string> {
  if (row.sourceKind === 'estimate') {
    const { estimates } = await listEstimates(tx, heldCase);
    return (lastOf(estimates, row.sourceId) ?? gone()).id;
  }
  if (row.sourceKind === 'material constant') return ((await findConstantNow(tx, row.sourceId)) ?? gone()).id;
  const [length] = await listLengthSources(tx, [row.sourceId]);
  const { markId, quantity } = length ?? gone();
  return (await readMeasurement(tx, context, heldCase, { markId, quantity })).id;
}

function gone(): never {
  throw nothingHere();
}
