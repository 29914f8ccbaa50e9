import type { OwnName, OwnView, Person, SettingsChange } from '#shared/contracts/people.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context, VisitorContext } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { presentOwn, presentSettings } from '../present.ts';
import { findPersonById, lockPerson, tellPersonChanged, updatePerson, updateSettings } from '../queries.ts';
import { endSessions } from '../queries/sessions.ts';
import { loadPersonOf } from './load-person.ts';

export async function loadOwn(context: Context): Promise<OwnView> {
  return presentOwn(loadPersonOf(await findPersonById(context.reader, context.person.id)));
}

/** Changes one's own name as it stands in the book from now on; what was signed keeps the name it was signed with. */
export function changeOwnName(context: Context, change: OwnName): Promise<OwnView> {
  return context.inTransaction(async (tx) => {
    const row = loadPersonOf(await lockPerson(tx, context.person.id));
    const isSeen = await updatePerson(tx, { id: row.id, version: change.version }, { name: change.name });
    if (!isSeen)
      throw new Problem('stale-version', 'Your account was changed meanwhile; look at both.', {
        current: presentOwn(row),
      });
    await recordAct(tx, context.person, {
      act: 'person.changed',
      objectId: row.id,
      before: { name: row.name },
      after: { name: change.name },
    });
    return presentOwn({ ...row, name: change.name, version: row.version + 1 });
  });
}

/** Keeps the theme, the height of rows and whether single letters act as keys, for every machine of the person. */
export function changeSettings(context: Context, change: SettingsChange) {
  return context.inTransaction(async (tx) => {
    const before = loadPersonOf(await lockPerson(tx, context.person.id));
    if (Object.keys(change).length === 0) return presentSettings(before);
    await updateSettings(tx, before.id, change);
    const after = presentSettings({ ...before, ...change });
    await recordAct(tx, context.person, {
      act: 'settings.changed',
      objectId: before.id,
      before: presentSettings(before),
      after,
    });
    return after;
  });
}

/** Ends every session of the person, on all machines, this one too. */
export function signOutEverywhere(context: Context): Promise<void> {
  return context.inTransaction(async (tx) => {
    await endSessions(tx, context.person.id);
    await tellPersonChanged(tx, context.person.id);
    await recordAct(tx, context.person, { act: 'person.signed-out-everywhere', objectId: context.person.id });
  });
}

/** Notes that the person signed out here. */
export function noteSignOut(context: VisitorContext, person: Person): Promise<void> {
  return context.besideAct((tx) => recordAct(tx, person, { act: 'person.signed-out', objectId: person.id }));
}
