import type { SignIn } from '#shared/contracts/people.ts';
import type { VisitorContext } from '../../../http/context.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { Problem } from '../../../http/problem.ts';
import { findPersonByMail, lockPerson, noteVisit } from '../queries.ts';
import { presentPerson } from '../present.ts';
import { passwordFits } from './password.ts';
import { admitTry, forgiveTry } from './sign-in-limits.ts';

/**
 * Who the mail address and password belong to; `machine` is the network address the try comes from.
 *
 * An unknown address, a wrong password, an invited and a closed account are answered alike, in the same time.
 * @throws Problem sign-in-failed, or too-many-tries with the wait
 */
export async function signIn(context: VisitorContext, tried: SignIn, machine: string) {
  const from = { mail: tried.mail, machine };
  const triesLeft = await context.besideAct((tx) => admitTry(tx, from));
  const row = await findPersonByMail(context.reader, tried.mail);
  const fits = await passwordFits(tried.password, row?.state === 'open' ? row.passwordHash : null);
  if (!row || !fits) {
    if (triesLeft === 0) await recordLock(context, row?.id);
    throw new Problem('sign-in-failed', `This address and password do not belong together.${remark(triesLeft)}`);
  }
  return context.besideAct(async (tx) => {
    const now = await lockPerson(tx, row.id);
    if (now?.state !== 'open' || now.passwordHash !== row.passwordHash)
      throw new Problem('sign-in-failed', 'This address and password do not belong together.');
    await forgiveTry(tx, from);
    await noteVisit(tx, row.id, tx.at);
    await recordAct(tx, row, { act: 'person.signed-in', objectId: row.id });
    return presentPerson(now);
  });
}

function recordLock(context: VisitorContext, personId: string | undefined) {
  return context.besideAct((tx) => recordAct(tx, null, { act: 'sign-in.locked', objectId: personId }));
}

const numberWords = ['No', 'One', 'Two'] as const;

function remark(triesLeft: number): string {
  if (triesLeft === 0) return ' Wait five minutes or more before the next try.';
  const word = numberWords[triesLeft];
  return word ? ` ${word} more ${triesLeft === 1 ? 'try' : 'tries'}, then a wait of five minutes.` : '';
}
