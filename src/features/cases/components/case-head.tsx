import type { ReactNode } from 'react';
import type { CaseView } from '#shared/contracts/cases.ts';
import { daysBetween, formatAge, formatDay } from '#shared/wording/dates.ts';
import { StateWord } from './state-word.tsx';

/** Number, title and how the case stands; at its right the menu of acts. */
export function CaseHead({ view, acts }: { view: CaseView; acts: ReactNode }) {
  const age = formatAge(daysBetween(view.receivedAt, view.closedAt ?? view.asOf));
  return (
    <header className="case-head">
      <div className="min-w-0">
        <span className="case-number">{view.number}</span>
        <h1>{view.title}</h1>
      </div>
      <div className="case-facts items-center">
        <StateWord state={view.state} holdUntil={view.hold?.until ?? null} />
        <span>
          with <b>{view.assignedTo?.name ?? 'no one yet'}</b>
        </span>
        <span>
          {view.closedAt ? 'took' : 'open'} <b>{age}</b>
        </span>
        {view.restricted ? <span title={view.namedPeople.map(({ name }) => name).join(', ')}>restricted</span> : null}
        {acts}
      </div>
    </header>
  );
}

/** The line under the head of a case that rests: closed and sealed, withdrawn, or on hold. */
export function CaseStandsStill({ view }: { view: CaseView }) {
  const line = stillLine(view);
  return line ? <p className="px-edge pt-2 text-s text-ink-2">{line}</p> : null;
}

function stillLine({ state, closedAt, sealNumber, withdrawnReason, stateSince, hold }: CaseView): ReactNode {
  if (state === 'closed')
    return (
      <>
        Closed on {formatDay(closedAt ?? stateSince)}
        {sealNumber ? (
          <>
            , sealed <span className="mono">{sealNumber}</span>
          </>
        ) : null}
        : nothing here can be changed.
      </>
    );
  if (state === 'withdrawn') return `Withdrawn on ${formatDay(stateSince)}: ${withdrawnReason ?? ''}`;
  return hold ? `On hold since ${formatDay(hold.since)} until ${formatDay(hold.until)}: ${hold.reason}` : null;
}
