import { useId, useState } from 'react';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import type { Answer } from '#shared/rules/may.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { StaleNote } from '#src/ui/stale-note.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { useEstimateActs } from '../api.ts';
import { SetText } from './set-text.tsx';

type StaleLineProps = { estimate: EstimateView; caseNumber: string; mayEstimate: Answer };

/** Why a line is stale, what it would become, whether the verdict would move, and the two ways out. */
export function StaleLine({ estimate, caseNumber, mayEstimate }: StaleLineProps) {
  const { renew, keepOld } = useEstimateActs(caseNumber);
  const [reason, setReason] = useState<string | null>(null);
  const errorId = useId();
  const { stale } = estimate;
  if (!stale) return null;
  const [change] = stale.changes;
  const fault = renew.error ?? keepOld.error;
  const acts = mayEstimate.allowed ? (
    <>
      {stale.wouldBe ? (
        <Button small disabled={renew.isPending} onClick={() => renew.mutate(estimate.id)}>
          <span>
            Take <SetText text={valueAlone(change?.now ?? stale.wouldBe.text)} />
          </span>
        </Button>
      ) : null}
      {reason === null ? (
        <button type="button" className="button is-plain is-small" onClick={() => setReason('')}>
          <span>
            Keep <SetText text={valueAlone(change?.was ?? estimate.origin.text)} />, say why
          </span>
        </button>
      ) : (
        <form
          className="grid w-full gap-2"
          onSubmit={(event) => {
            event.preventDefault();
            keepOld.mutate({ id: estimate.id, reason });
          }}
        >
          <TextArea
            label="Why the old value is kept"
            rows={3}
            value={reason}
            onChange={(event) => setReason(event.target.value)}
          />
          <Button small type="submit" disabled={keepOld.isPending}>
            <span>
              Keep <SetText text={valueAlone(change?.was ?? estimate.origin.text)} />
            </span>
          </Button>
        </form>
      )}
      {fault ? (
        <FieldError id={errorId}>
          {fault instanceof Refusal ? fault.body.message : 'The server did not answer.'}
        </FieldError>
      ) : null}
    </>
  ) : null;
  return (
    <StaleNote since={formatShortDay(stale.since)} acts={acts}>
      <StaleWords estimate={estimate} />
    </StaleNote>
  );
}

function StaleWords({ estimate }: { estimate: EstimateView }) {
  const { stale, line } = estimate;
  if (!stale) return null;
  const causes = stale.causes.map((cause) => cause.why).join('; ');
  // The word on a replaced constant says from what to what already.
  const changes = stale.causes.every((cause) => cause.kind === 'material constant') ? [] : stale.changes;
  return (
    <>
      The {line} line no longer rests on what holds: <SetText text={causes} />.{' '}
      {changes.map((change) => (
        <span key={change.input}>
          {change.label} was <SetText text={change.was} /> and now reads <SetText text={change.now} />.{' '}
        </span>
      ))}
      {stale.wouldBe ? (
        <>
          With it the line gives <b className="whitespace-nowrap">{stale.wouldBe.text}</b> and{' '}
          {stale.verdictThen === stale.verdictNow
            ? 'the verdict stays.'
            : `the verdict would move from ${stale.verdictNow} to ${stale.verdictThen ?? 'too few'}.`}
        </>
      ) : (
        stale.hindrance
      )}
    </>
  );
}

/** What is taken or kept, short enough for a button; its ± stands in the note above. */
function valueAlone(text: string): string {
  return text.replace(/\u00a0±\u00a0[^\u00a0]+/, '');
}
