import { seesCase } from '#shared/rules/may.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { writeMail } from '../../../mail/write-mail.ts';
import { factsOf, lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { moveCase } from '../../cases/service/move-case.ts';
import { keepFindingsVersion } from '../../findings/service/keep-version.ts';
import { listManagers } from '../../people/service/list-managers.ts';
import { insertRound, listRoundRows, type HeldCase } from '../queries/closures.ts';
import { listReadiness } from './gather-facts.ts';

/**
 * Sends a case to review: keeps a version of the findings, opens a round and tells the managers, with no more than
 * number, state and link. @throws Problem not-ready naming the first blocker
 */
export function sendToReview(context: Context, heldCase: HeldFor<'send to review'>): Promise<{ round: number }> {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, heldCase, 'send to review');
    const blocker = (await listReadiness(tx, context, locked)).find((point) => point.kind === 'blocker');
    if (blocker)
      throw new Problem('not-ready', blocker.sentence, { stillHolds: `${locked.number} stays in drafting.` });
    const round = ((await listRoundRows(tx, locked)).at(0)?.round ?? 0) + 1;
    const version = await keepFindingsVersion(tx, context, locked, `Review, round ${round}`);
    const made = await insertRound(tx, {
      caseId: locked.id,
      round,
      findingsVersionId: version.id,
      sentBy: context.person.id,
      sentAt: tx.at,
    });
    await recordAct(tx, context.person, {
      act: 'review.sent',
      inCase: locked,
      objectId: made.id,
      after: { round, findingsVersion: version.number },
    });
    await moveCase(tx, context, locked, 'in review');
    await tellManagers(tx, locked);
    return { round };
  });
}

async function tellManagers(tx: Transaction, heldCase: HeldCase): Promise<void> {
  const managers = await listManagers(tx);
  for (const manager of managers.filter((each) => seesCase(each, factsOf(heldCase)))) {
    await writeMail(tx, {
      to: manager.mail,
      subject: `${heldCase.number} is in review`,
      body: `${heldCase.number} has been sent to review and waits to be read and signed.`,
      link: `/cases/${heldCase.number}/review`,
    });
  }
}
