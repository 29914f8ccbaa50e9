import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { listOpenStaleness, settleStaleness } from '../../../lineage/settle-staleness.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { findEstimateRow, insertStanding } from '../queries/estimates.ts';

/** Keeps a stale estimate as it is, and says why. @throws Problem wrong-state where it is not stale */
export function keepOldValue(context: Context, heldCase: HeldFor<'estimate'>, id: string, kept: { reason: string }) {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'estimate');
    const row = await findEstimateRow(tx, heldCase, id);
    if (!row) throw nothingHere();
    const open = await listOpenStaleness(tx, [id]);
    if (open.length === 0) throw new Problem('wrong-state', `Estimate ${row.number} is not stale.`);
    await settleStaleness(tx, id, { by: context.person.id, settlement: 'kept', reason: kept.reason });
    await recordAct(tx, context.person, {
      act: 'stale.kept',
      inCase: heldCase,
      objectId: id,
      before: { estimate: row.number, why: open.map((each) => each.why) },
      reason: kept.reason,
    });
  });
}

export type Standing = { standing: 'in use' | 'set aside'; reason: string };

/** Sets an estimate aside, or takes it up again, with a reason. It stays shown either way. */
export function changeStanding(context: Context, heldCase: HeldFor<'estimate'>, id: string, wanted: Standing) {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'estimate');
    const row = await findEstimateRow(tx, heldCase, id);
    if (!row) throw nothingHere();
    const now = row.standing ?? 'in use';
    if (now === wanted.standing) throw new Problem('wrong-state', `Estimate ${row.number} is ${now} already.`);
    await insertStanding(tx, {
      ...wanted,
      caseId: heldCase.id,
      estimateId: id,
      madeBy: context.person.id,
      madeAt: tx.at,
    });
    await recordAct(tx, context.person, {
      act: wanted.standing === 'set aside' ? 'estimate.set-aside' : 'estimate.taken-up',
      inCase: heldCase,
      objectId: id,
      before: { estimate: row.number, standing: now },
      after: { estimate: row.number, standing: wanted.standing },
      reason: wanted.reason,
    });
  });
}
