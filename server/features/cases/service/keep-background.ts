import type { z } from 'zod';
import type { BackgroundChanged, BackgroundGiven, BackgroundTakenBack } from '#shared/contracts/cases.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { findBackground, insertBackground, listBackground, updateBackground } from '../queries/background.ts';
import { presentBackground } from '../present.ts';
import { requireSeenVersion } from './seen-version.ts';

/** What is known, told and assumed of a case. */
export async function listStatements(reader: Reader, heldCase: HeldFor<'read'> | HeldFor<'edit'>) {
  return (await listBackground(reader, heldCase.id)).map(presentBackground);
}

export function addStatement(context: Context, heldCase: HeldFor<'edit'>, given: BackgroundGiven) {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, heldCase, 'edit');
    const made = { ...given, caseId: locked.id, madeBy: context.person.id, madeAt: tx.at };
    const { id } = await insertBackground(tx, made);
    await recordAct(tx, context.person, { act: 'background.added', inCase: locked, objectId: id, after: given });
    return listStatements(tx, locked);
  });
}

export function changeStatement(
  context: Context,
  heldCase: HeldFor<'edit'>,
  { id, change }: { id: string; change: z.infer<typeof BackgroundChanged> },
) {
  return context.inTransaction(async (tx) => {
    const { versionSeen, ...after } = change;
    const { locked, before } = await lockStatement(tx, context, { heldCase, id, versionSeen });
    await updateBackground(tx, id, after);
    await recordAct(tx, context.person, { act: 'background.changed', inCase: locked, objectId: id, before, after });
    return listStatements(tx, locked);
  });
}

/** Takes a statement back: it no longer stands, and the trail keeps it with the reason. */
export function takeBackStatement(
  context: Context,
  heldCase: HeldFor<'edit'>,
  { id, change }: { id: string; change: z.infer<typeof BackgroundTakenBack> },
) {
  return context.inTransaction(async (tx) => {
    const { versionSeen, reason } = change;
    const { locked, before } = await lockStatement(tx, context, { heldCase, id, versionSeen });
    await updateBackground(tx, id, { takenBackAt: tx.at });
    await recordAct(tx, context.person, { act: 'background.taken-back', inCase: locked, objectId: id, before, reason });
    return listStatements(tx, locked);
  });
}

async function lockStatement(
  tx: Transaction,
  context: Context,
  { heldCase, id, versionSeen }: { heldCase: HeldFor<'edit'>; id: string; versionSeen: number },
) {
  const locked = await lockCase(tx, context, heldCase, 'edit');
  const row = await findBackground(tx, locked.id, id);
  if (!row) throw nothingHere();
  await requireSeenVersion(versionSeen, {
    version: row.version,
    what: 'This statement',
    current: () => Promise.resolve(presentBackground(row)),
  });
  const { statement, standing, source, givenOn } = row;
  return { locked, before: { statement, standing, source, givenOn } };
}
