import type { Context } from '../../../http/context.ts';
import { recordAct } from '../../../audit/record-act.ts';
import { Problem } from '../../../http/problem.ts';
import { findPersonById } from '../queries.ts';
import { loadPersonOf } from './load-person.ts';
import { passwordFits } from './password.ts';
import { admitTry, forgiveTry } from './sign-in-limits.ts';

/**
 * Has the signed-in person's password typed once more, before an act that vouches for something. A wrong one counts
 * like a failed sign-in, with the same wait; `machine` is the network address the try comes from.
 * @throws Problem not-valid at `password`, or too-many-tries with the wait
 */
export async function confirmPassword(context: Context, password: string, machine: string): Promise<void> {
  const row = loadPersonOf(await findPersonById(context.reader, context.person.id));
  const from = { mail: row.mail, machine };
  const triesLeft = await context.besideAct((tx) => admitTry(tx, from));
  if (!(await passwordFits(password, row.state === 'open' ? row.passwordHash : null))) {
    if (triesLeft === 0)
      await context.besideAct((tx) => recordAct(tx, null, { act: 'sign-in.locked', objectId: row.id }));
    throw new Problem('not-valid', 'This is not your password.', {
      field: 'password',
      stillHolds: 'Nothing was signed.',
    });
  }
  await context.besideAct((tx) => forgiveTry(tx, from));
}
