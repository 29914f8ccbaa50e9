import type { QuestionsAgreed } from '#shared/contracts/cases.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { insertQuestions, listQuestionVersions } from '../queries/questions.ts';
import { presentQuestions } from '../present.ts';
import { requireSeenVersion } from './seen-version.ts';

/** Every agreed version of the questions, newest first. */
export async function listQuestions(reader: Reader, heldCase: HeldFor<CaseAct>) {
  return (await listQuestionVersions(reader, heldCase.id)).map(presentQuestions);
}

/** Agrees a new version of the questions; a wording once agreed says why it was changed, and stays readable. */
export function agreeQuestions(context: Context, heldCase: HeldFor<'edit'>, agreed: QuestionsAgreed) {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, heldCase, 'edit');
    const [newest] = await listQuestions(tx, locked);
    const version = newest?.version ?? 0;
    await requireSeenVersion(agreed.versionSeen, {
      version,
      what: `What was asked of ${locked.number}`,
      current: () => Promise.resolve(newest),
    });
    if (newest && agreed.reason === '')
      throw new Problem('not-valid', 'Say why what was agreed is changed.', { field: 'reason' });
    const { questions, besideScope } = agreed;
    const reason = agreed.reason === '' ? null : agreed.reason;
    const made = { questions, besideScope, reason, version: version + 1 };
    await insertQuestions(tx, { ...made, caseId: locked.id, madeBy: context.person.id, madeAt: tx.at });
    await recordAct(tx, context.person, {
      act: 'questions.agreed',
      inCase: locked,
      before: newest ? { version, questions: newest.questions, besideScope: newest.besideScope } : null,
      after: { version: made.version, questions, besideScope },
      reason,
    });
    return listQuestions(tx, locked);
  });
}
