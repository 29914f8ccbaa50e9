import { actTable, type ActName, type ActRow } from '../../audit/act-table.ts';
import type { CasebookCounts, CasebookRow } from '#shared/contracts/casebook.ts';
import type { BackgroundView, CaseAnswer, HistoryEntry, PlainState, QuestionsView } from '#shared/contracts/cases.ts';
import { CaseId, CaseNumber } from '#shared/contracts/ids.ts';
import type { CaseState } from '#shared/vocabulary/case-states.ts';
import type { CaseRow } from '../../rights/queries.ts';
import type { listBackground } from './queries/background.ts';
import type { CasebookRowRead } from './queries/casebook.ts';
import type { CountsRead } from './queries/casebook-counts.ts';
import type { loadCaseNames } from './queries/cases.ts';
import type { listEntries } from './queries/history.ts';
import type { listQuestionVersions } from './queries/questions.ts';

type Row<Query extends (...args: never[]) => PromiseLike<readonly unknown[]>> = Awaited<ReturnType<Query>>[number];

const plainStateOf: Readonly<Record<CaseState, PlainState>> = {
  received: 'received',
  examining: 'looked at',
  drafting: 'written up',
  'in review': 'being checked',
  closed: 'answered',
  withdrawn: 'withdrawn',
};

/** An instant as the database writes it in text, in ISO 8601. */
const iso = (written: string) => new Date(written).toISOString();
const named = (id: string | null, name: string | null) => (id !== null && name !== null ? { id, name } : null);

export function presentFollowedCase(row: CaseRow): CaseAnswer {
  return {
    seenAs: 'requester',
    number: CaseNumber.parse(row.number),
    title: row.title,
    plainState: plainStateOf[row.state],
    receivedAt: row.receivedAt.toISOString(),
    stateSince: row.stateSince.toISOString(),
  };
}

export function presentCase(
  row: CaseRow,
  names: Awaited<ReturnType<typeof loadCaseNames>>,
  beside: { namedPeople: { id: string; name: string }[]; asOf: Date },
): CaseAnswer {
  const { title, summary, kind, state, withdrawnReason, urgency, restricted, authorIds, scope, version } = row;
  const { sealNumber, fractographs, estimates, stale, staleInText } = names;
  return {
    seenAs: 'laboratory',
    ...{ title, summary, kind, state, withdrawnReason, urgency, restricted, authorIds, scope, version, sealNumber },
    id: CaseId.parse(row.id),
    number: CaseNumber.parse(row.number),
    hold:
      row.holdReason !== null && row.holdUntil !== null && row.heldSince !== null
        ? { reason: row.holdReason, until: row.holdUntil, since: row.heldSince.toISOString() }
        : null,
    organisation: { id: row.organisationId, name: names.organisationName },
    material: named(row.materialId, names.materialName),
    assignedTo: named(row.assignedTo, names.assignedName),
    namedPeople: beside.namedPeople,
    receivedAt: row.receivedAt.toISOString(),
    stateSince: row.stateSince.toISOString(),
    closedAt: row.closedAt?.toISOString() ?? null,
    counts: { fractographs, estimates, stale, staleInText },
    asOf: beside.asOf.toISOString(),
  };
}

export function presentCasebookRow(row: CasebookRowRead, seenAs: CasebookRow['seenAs']): CasebookRow {
  const number = CaseNumber.parse(row.number);
  const { title, state, urgency } = row;
  const [receivedAt, stateSince] = [iso(row.received_at), iso(row.state_since)];
  if (seenAs === 'administrator') return { seenAs, number, state, holdUntil: row.hold_until };
  if (seenAs === 'requester') return { seenAs, number, title, plainState: plainStateOf[state], receivedAt, stateSince };
  const { picture_fractograph_id: fractographId, picture_x: x, picture_y: y, picture_across: acrossPx } = row;
  return {
    ...{ seenAs, number, title, state, urgency, receivedAt },
    material: row.material,
    holdUntil: row.hold_until,
    closedAt: row.closed_at === null ? null : iso(row.closed_at),
    assignedTo: named(row.assigned_to, row.assigned_name),
    hasFractographs: row.has_fractographs,
    originCode: row.origin_code,
    picture:
      fractographId !== null && x !== null && y !== null && acrossPx !== null
        ? { fractographId, x, y, acrossPx }
        : null,
    stale:
      row.stale_cause !== null && row.stale_why !== null && row.stale_since !== null
        ? { cause: row.stale_cause, why: row.stale_why, since: iso(row.stale_since) }
        : null,
  };
}

export function presentCounts(read: CountsRead, asOf: Date): CasebookCounts {
  const { all, open, stale } = read;
  return {
    ...{ all, open, stale },
    thisYear: read.this_year,
    withMe: read.with_me,
    toSign: read.to_sign,
    inReview: read.in_review,
    oldestOpenAt: read.oldest_open_at === null ? null : iso(read.oldest_open_at),
    asOf: asOf.toISOString(),
  };
}

export function presentQuestions(row: Row<typeof listQuestionVersions>): QuestionsView {
  const { version, questions, besideScope, reason, madeBy, madeByName, madeAt } = row;
  return {
    ...{ version, questions, besideScope, reason },
    madeBy: { id: madeBy, name: madeByName },
    madeAt: madeAt.toISOString(),
  };
}

export function presentBackground(row: Row<typeof listBackground>): BackgroundView {
  const { id, statement, standing, source, givenOn, madeBy, madeByName, madeAt, version } = row;
  return {
    ...{ id, statement, standing, source, givenOn, version },
    madeBy: { id: madeBy, name: madeByName },
    madeAt: madeAt.toISOString(),
  };
}

/** An entry of the trail in words: what was done, and where it leads the case, to what. */
export function presentEntry(row: Row<typeof listEntries>): HistoryEntry {
  const { id, personName, reason } = row;
  return { id, personName, reason, at: row.at.toISOString(), words: wordsOf(row.act, row.after) };
}

function wordsOf(act: string, after: unknown): string {
  const known = (name: string): name is ActName => name in actTable;
  const row: ActRow | null = known(act) ? actTable[act] : null;
  const words = row?.words ?? act;
  const state = typeof after === 'object' && after !== null && 'state' in after ? after.state : null;
  return act === 'case.moved' && typeof state === 'string' ? `${words} to ${state}` : words;
}
