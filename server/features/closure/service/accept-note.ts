import type { NoteAccepted } from '#shared/contracts/closure.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { insertAcceptedNote, listAcceptedNotes } from '../queries/closures.ts';
import { listReadiness } from './gather-facts.ts';

/**
 * A manager lets a note of the readiness list stand, with the reason.
 * @throws Problem not-valid where the list has no such note, already-there where it has been accepted
 */
export function acceptNote(context: Context, heldCase: HeldFor<'accept a note'>, { note, reason }: NoteAccepted) {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, heldCase, 'accept a note');
    const notes = (await listReadiness(tx, context, locked)).filter((point) => point.kind === 'note');
    if (!notes.some((each) => each.sentence === note))
      throw new Problem('not-valid', 'This note is not on the readiness list of the case.', { field: 'note' });
    if ((await listAcceptedNotes(tx, locked)).some((each) => each.note === note))
      throw new Problem('already-there', 'This note has been accepted already.');
    const accepted = { note, reason, acceptedBy: context.person.id, acceptedAt: tx.at };
    const made = await insertAcceptedNote(tx, { ...accepted, caseId: locked.id });
    await recordAct(tx, context.person, {
      act: 'note.accepted',
      inCase: locked,
      objectId: made.id,
      after: { note },
      reason,
    });
  });
}
