import { CheckIcon } from '@phosphor-icons/react/dist/csr/Check';
import { CircleDashedIcon } from '@phosphor-icons/react/dist/csr/CircleDashed';
import { WarningIcon } from '@phosphor-icons/react/dist/csr/Warning';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { ReadinessPointView, ReviewView } from '#shared/contracts/closure.ts';
import { formatInstantIn } from '#shared/wording/instant-in-zone.ts';
import { StaleGlyph } from '#src/ui/glyphs/stale-glyph.tsx';
import { Button } from '#src/ui/button.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import type { ReviewActs } from '../api.ts';
import { AcceptNoteForm } from './accept-note-form.tsx';

type ReadinessListProps = { review: ReviewView; acts: ReviewActs; title: string };

/** What stands between the case and its seal: each point with its glyph, its sentence and the chapter it is seen to in. */
export function ReadinessList({ review, acts, title }: ReadinessListProps) {
  const { readiness } = review;
  return (
    <section aria-label={title}>
      <RuleHead aside={asideOf(readiness)}>{title}</RuleHead>
      {readiness.length === 0 ? (
        <p className="mt-3 flex items-center gap-2 font-semibold text-celadon">
          <CheckIcon size={16} aria-hidden />
          Nothing stands in the way.
        </p>
      ) : (
        <ul>
          {readiness.map((point, index) => (
            <Point key={`${point.code} ${point.sentence} ${index}`} point={point} review={review} acts={acts} />
          ))}
        </ul>
      )}
    </section>
  );
}

function asideOf(readiness: readonly ReadinessPointView[]): string {
  const blockers = readiness.filter((point) => point.kind === 'blocker').length;
  const notes = readiness.filter((point) => point.kind === 'note' && !point.accepted).length;
  const words = [blockers > 0 ? `${blockers} to settle` : '', notes > 0 ? `${notes} to accept or settle` : ''];
  return words.filter((each) => each !== '').join(', ');
}

type PointProps = { point: ReadinessPointView; review: ReviewView; acts: ReviewActs };

function Point({ point, review, acts }: PointProps) {
  const [isAccepting, setAccepting] = useState(false);
  const { accepted, kind, sentence, chapter } = point;
  const mayAccept = kind === 'note' && !accepted && review.acts.acceptNotes.allowed;
  return (
    <li className="border-b border-hairline py-2">
      <div className="flex items-start gap-[10px]">
        <span className="mt-[3px] flex-none">
          <PointGlyph point={point} />
        </span>
        <p className="min-w-0 flex-1">
          {kind === 'blocker' ? <b>{sentence}</b> : sentence}{' '}
          <Link to={`../${chapter}`} relative="path" className="text-s whitespace-nowrap">
            Go to {chapter[0].toUpperCase() + chapter.slice(1)}
          </Link>
        </p>
        {mayAccept && !isAccepting ? (
          <Button small onClick={() => setAccepting(true)}>
            Accept this note
          </Button>
        ) : null}
      </div>
      {accepted ? (
        <p className="mt-1 pl-[26px] text-s text-ink-2">
          Accepted by {accepted.by.name}, {formatInstantIn(accepted.at, review.zone)}: {accepted.reason}
        </p>
      ) : null}
      {mayAccept && isAccepting ? (
        <AcceptNoteForm note={sentence} act={acts.acceptNote} onLeave={() => setAccepting(false)} />
      ) : null}
    </li>
  );
}

function PointGlyph({ point: { kind, code, accepted } }: { point: ReadinessPointView }) {
  if (accepted) return <CheckIcon size={16} className="text-celadon" aria-label="accepted" />;
  if (code.endsWith('stale')) return <StaleGlyph />;
  if (kind === 'blocker') return <WarningIcon size={16} className="text-iron" aria-label="to settle" />;
  return <CircleDashedIcon size={16} className="text-ink-2" aria-label="note" />;
}
