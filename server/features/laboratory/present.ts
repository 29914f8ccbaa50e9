import type { HeldMailOpened, HeldMailView, MailView, TrailEntry } from '#shared/contracts/laboratory.ts';
import { actTable, type ActRow } from '../../audit/act-table.ts';
import type { HeldRow, OutgoingRow } from '../../mail/queries.ts';
import type { AuditRow } from './queries.ts';

export function presentMail(row: OutgoingRow): MailView {
  const { id, toMail, subject, state, tries, fault } = row;
  return {
    id,
    toMail,
    subject,
    state,
    tries,
    fault,
    writtenAt: row.writtenAt.toISOString(),
    goneAt: row.goneAt?.toISOString() ?? null,
  };
}

export function presentHeld({ id, toMail, subject, heldAt }: HeldRow): HeldMailView {
  return { id, toMail, subject, heldAt: heldAt.toISOString() };
}

export function presentOpened(row: HeldRow): HeldMailOpened {
  return { ...presentHeld(row), body: row.body };
}

/** What the trail calls an act; one of an older form keeps its own name. */
export function wordsOfAct(act: string): string {
  const rows: Readonly<Record<string, ActRow | undefined>> = actTable;
  return rows[act]?.words ?? act;
}

/** An entry as an administrator sees it: of what happened in a case, only its number and its states. */
export function presentEntry(row: AuditRow, caseNumber: string | null, names: ReadonlyMap<string, string>): TrailEntry {
  const isInCase = row.chain !== 'laboratory';
  return {
    id: row.id,
    at: row.at.toISOString(),
    personName: row.personName,
    act: row.act,
    words: wordsOfAct(row.act),
    caseNumber,
    object: isInCase ? null : (names.get(row.objectId ?? '') ?? null),
    before: isInCase ? stateOnly(row.before) : row.before,
    after: isInCase ? stateOnly(row.after) : row.after,
    reason: isInCase ? null : row.reason,
  };
}

function stateOnly(value: unknown): { state: string } | null {
  if (typeof value !== 'object' || value === null || !('state' in value)) return null;
  return typeof value.state === 'string' ? { state: value.state } : null;
}
