import type { CaseOpened } from '#shared/contracts/cases.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { insertCase } from '../queries/cases.ts';
import { takeCaseNumber } from '../queries/case-number.ts';
import { insertQuestions } from '../queries/questions.ts';

/** Opens a case as received now, under the next number of the year, with the questions first asked as their version 1. */
export function openNewCase(context: Context, opened: CaseOpened): Promise<{ id: string; number: string }> {
  const { questions, ...asked } = opened;
  return context.inTransaction(async (tx) => {
    const number = await takeCaseNumber(tx);
    const made = await insertCase(tx, { ...asked, number, state: 'received', receivedAt: tx.at, stateSince: tx.at });
    await recordAct(tx, context.person, {
      act: 'case.opened',
      inCase: made,
      objectId: made.id,
      after: { ...asked, number },
    });
    if (questions.length > 0) {
      const version = { caseId: made.id, version: 1, questions, madeBy: context.person.id, madeAt: tx.at };
      await insertQuestions(tx, version);
      await recordAct(tx, context.person, { act: 'questions.agreed', inCase: made, after: { version: 1, questions } });
    }
    return made;
  });
}
