import type { SignIn } from '#shared/contracts/people.ts';
import type { VisitorContext } from '../../../http/context.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { Problem } from '../../../http/problem.ts';
import { findPersonByMail, noteVisit } from '../queries.ts';
import { presentPerson } from '../present.ts';
import { passwordFits } from './password.ts';

/** Who the mail address and password belong to. @throws Problem sign-in-failed, never saying which part was wrong. */
export async function signIn(context: VisitorContext, tried: SignIn) {
  const row = await findPersonByMail(context.reader, tried.mail);
  const fits = await passwordFits(tried.password, row?.state === 'open' ? row.passwordHash : null);
  if (!row || !fits) throw new Problem('sign-in-failed', 'This address and password do not belong together.');
  await context.inTransaction(async (tx) => {
    await noteVisit(tx, row.id, tx.at);
    await recordAct(tx, row, { act: 'person.signed-in', objectId: row.id });
  });
  return presentPerson(row);
}
