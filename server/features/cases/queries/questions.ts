import { desc, eq } from 'drizzle-orm';
import type { Reader, Transaction } from '../../../database/connection.ts';
import { caseQuestions } from '../../../database/tables/cases.ts';
import { people } from '../../../database/tables/people.ts';

/** Every version of the agreed questions, newest first. */
export function listQuestionVersions(reader: Reader, caseId: string) {
  return reader.db
    .select({
      version: caseQuestions.version,
      questions: caseQuestions.questions,
      besideScope: caseQuestions.besideScope,
      reason: caseQuestions.reason,
      madeBy: caseQuestions.madeBy,
      madeByName: people.name,
      madeAt: caseQuestions.madeAt,
    })
    .from(caseQuestions)
    .innerJoin(people, eq(caseQuestions.madeBy, people.id))
    .where(eq(caseQuestions.caseId, caseId))
    .orderBy(desc(caseQuestions.version));
}

export async function insertQuestions(tx: Transaction, values: typeof caseQuestions.$inferInsert) {
  await tx.db.insert(caseQuestions).values(values);
}
