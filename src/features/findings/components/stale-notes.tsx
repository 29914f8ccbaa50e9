import { useQuery } from '@tanstack/react-query';
import type { Editor } from '@tiptap/react';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { createPortal } from 'react-dom';
import { Link } from 'react-router-dom';
import type { BoundValueView, FigureView } from '#shared/contracts/findings.ts';
import { formatDay } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { StaleNote } from '#src/ui/stale-note.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { boundValuesOf, figuresOf, useFindingsActs } from '../api.ts';
import { keepNotesApart, type StaleMarginStore } from '../editor/stale-margin.ts';

type StaleNotesProps = { number: string; editor: Editor; margin: StaleMarginStore; mayWrite: boolean };

/** The notes beside what is stale, each at the line it speaks of, with the two ways out. */
export function StaleNotes({ number, editor, margin, mayWrite }: StaleNotesProps) {
  const places = useSyncExternalStore(margin.subscribe, margin.places);
  const { data: values = [] } = useQuery(boundValuesOf(number));
  const { data: figures = [] } = useQuery(figuresOf(number));
  useEffect(() => keepNotesApart(editor.view));
  return places.map(({ key, valueIds, figureIds, host }) =>
    createPortal(
      <>
        {values
          .filter((value) => valueIds.includes(value.id))
          .map((value) => (
            <StaleValue key={value.id} number={number} editor={editor} value={value} mayWrite={mayWrite} />
          ))}
        {figures
          .filter((figure) => figureIds.includes(figure.id))
          .map((figure) => (
            <StaleFigure key={figure.id} number={number} editor={editor} figure={figure} mayWrite={mayWrite} />
          ))}
      </>,
      host,
      key,
    ),
  );
}

type StaleValueProps = { number: string; editor: Editor; value: BoundValueView; mayWrite: boolean };

function StaleValue({ number, editor, value, mayWrite }: StaleValueProps) {
  const { renew, keepOld } = useFindingsActs(number);
  const [reason, setReason] = useState<string | null>(null);
  const { stale } = value;
  if (!stale) return null;
  const take = () =>
    renew.mutate(value.id, {
      onSuccess: (fresh) => {
        if (fresh) editor.commands.replaceBoundValue(value.id, fresh.id);
      },
    });
  const fault = renew.error ?? keepOld.error;
  return (
    <StaleNote
      since={formatDay(stale.since)}
      acts={
        <>
          {mayWrite ? (
            <div className="flex flex-wrap items-center gap-3">
              <Button small disabled={renew.isPending} onClick={take}>
                Take the new value
              </Button>
              <Link to={value.href}>{hrefWords(value)}</Link>
            </div>
          ) : null}
          {mayWrite && reason === null ? (
            <button type="button" className="button is-plain is-small" onClick={() => setReason('')}>
              Keep the old, say why
            </button>
          ) : null}
          {reason === null ? null : (
            <form
              className="grid w-full gap-2"
              onSubmit={(event) => {
                event.preventDefault();
                keepOld.mutate({ id: value.id, reason });
              }}
            >
              <TextArea
                label="Why the old value is kept"
                value={reason}
                onChange={(event) => setReason(event.target.value)}
              />
              <Button small type="submit" disabled={keepOld.isPending}>
                Keep {value.text}
              </Button>
            </form>
          )}
          {fault ? <FieldError id={`fault-${value.id}`}>{fault.message}</FieldError> : null}
        </>
      }
    >
      {value.text}: {stale.why}.{' '}
      {stale.would ? (
        <>
          It would read <b className="whitespace-nowrap">{stale.would}</b>.
        </>
      ) : (
        'Nothing in force says it any more.'
      )}
    </StaleNote>
  );
}

function hrefWords({ sourceKind }: BoundValueView): string {
  if (sourceKind === 'estimate') return 'Estimates';
  return sourceKind === 'measurement' ? 'The bench' : 'The material';
}

type StaleFigureProps = { number: string; editor: Editor; figure: FigureView; mayWrite: boolean };

function StaleFigure({ number, editor, figure, mayWrite }: StaleFigureProps) {
  const { drawAgain } = useFindingsActs(number);
  if (!figure.stale) return null;
  const again = () =>
    drawAgain.mutate(figure.id, {
      onSuccess: (fresh) => {
        if (fresh) editor.commands.replaceFigure(figure.id, fresh.id);
      },
    });
  return (
    <StaleNote
      since={formatDay(figure.stale.since)}
      acts={
        <>
          {mayWrite ? (
            <Button small disabled={drawAgain.isPending} onClick={again}>
              Draw again
            </Button>
          ) : null}
          {drawAgain.error ? <FieldError id={`fault-${figure.id}`}>{drawAgain.error.message}</FieldError> : null}
        </>
      }
    >
      Fig. {figure.figureNumber} shows what stood before: {figure.stale.why}.
    </StaleNote>
  );
}
