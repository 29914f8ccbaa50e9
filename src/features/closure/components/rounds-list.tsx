import type { ReviewView, RoundView } from '#shared/contracts/closure.ts';
import { formatInstantIn } from '#shared/wording/instant-in-zone.ts';
import { RuleHead } from '#src/ui/rule-head.tsx';

/** Every round of review, newest first, with why it was sent back. */
export function RoundsList({ review: { rounds, zone } }: { review: ReviewView }) {
  if (rounds.length === 0) return null;
  return (
    <section aria-label="Rounds of review" className="mt-5">
      <RuleHead small aside={rounds.length === 1 ? 'one round' : `${rounds.length} rounds`}>
        Rounds of review
      </RuleHead>
      <ol>
        {rounds.map((round) => (
          <Round key={round.round} round={round} zone={zone} />
        ))}
      </ol>
    </section>
  );
}

function Round({ round, zone }: { round: RoundView; zone: string }) {
  const { endedBy, endedAt, outcome, reasons } = round;
  return (
    <li className="border-b border-hairline py-2">
      <p>
        <b>Round {round.round}</b>, findings version {round.findingsVersion}: sent by {round.sentBy.name},{' '}
        <span className="text-ink-2">{formatInstantIn(round.sentAt, zone)}</span>
      </p>
      {outcome && endedBy && endedAt ? (
        <p className="mt-1">
          {outcome === 'approved' ? 'Approved' : 'Sent back'} by {endedBy.name},{' '}
          <span className="text-ink-2">{formatInstantIn(endedAt, zone)}</span>
        </p>
      ) : null}
      {reasons ? <p className="mt-1 font-serif text-prose">{reasons}</p> : null}
    </li>
  );
}
