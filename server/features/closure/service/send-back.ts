import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { moveCase } from '../../cases/service/move-case.ts';
import { endRound } from '../queries/closures.ts';
import { loadOpenRound } from './load-open-round.ts';

/** A manager sends the case back to drafting; the reasons stay with the round. */
export function sendBack(context: Context, heldCase: HeldFor<'send back'>, { reasons }: { reasons: string }) {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, heldCase, 'send back');
    const round = await loadOpenRound(tx, locked);
    const end = { outcome: 'sent back', reasons, endedBy: context.person.id, endedAt: tx.at } as const;
    await endRound(tx, round.id, end);
    await recordAct(tx, context.person, {
      act: 'review.sent-back',
      inCase: locked,
      objectId: round.id,
      after: { round: round.round },
      reason: reasons,
    });
    await moveCase(tx, context, locked, 'drafting', { reason: reasons });
  });
}
