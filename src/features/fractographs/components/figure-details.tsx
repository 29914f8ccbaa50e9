import { useState } from 'react';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { Answer } from '#shared/rules/may.ts';
import { formatDay, formatShortDay } from '#shared/wording/dates.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { Button } from '#src/ui/button.tsx';
import { ButtonLink } from '#src/ui/button-link.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { StaleNote } from '#src/ui/stale-note.tsx';
import { WithMargin } from '#src/ui/with-margin.tsx';
import { missingFacts, scaleInWords, scaleUncertaintyInWords } from '../scale-in-words.ts';
import { sizeInWords } from '../size-in-words.ts';
import { DescribeForm } from './describe-form.tsx';
import { ScaleForm } from './scale-form.tsx';

type FigureDetailsProps = {
  number: string;
  figure: FractographView;
  mayDescribe: Answer;
  mayCalibrate: Answer;
};

type Open = 'nothing' | 'description' | 'scale';

/** All that is known of one fractograph, what is missing, and the ways to say more. */
export function FigureDetails({ number, figure, mayDescribe, mayCalibrate }: FigureDetailsProps) {
  const [open, setOpen] = useState<Open>('nothing');
  const close = () => setOpen('nothing');
  const isReady = figure.state === 'ready';
  return (
    <section aria-label={`Fig. ${figure.figureNumber}`}>
      <RuleHead aside={figure.fileName}>Fig. {figure.figureNumber}</RuleHead>
      {figure.caption ? <p className="mt-2 font-serif text-prose">{figure.caption}</p> : null}
      {figure.state === 'refused' ? <Refused figure={figure} /> : null}
      <SameBytes figure={figure} />
      {isReady ? <Scale figure={figure} /> : null}
      {isReady ? (
        <div className="acts mt-4">
          <ButtonLink kind="main" to={`/cases/${number}/fractographs/${figure.id}`}>
            Open on the bench
          </ButtonLink>
          <Button
            closedBecause={mayCalibrate.allowed ? undefined : mayCalibrate.reason}
            onClick={() => setOpen('scale')}
          >
            {figure.scale ? 'Change the scale' : 'Give it its scale'}
          </Button>
        </div>
      ) : null}
      {open === 'scale' ? <ScaleForm number={number} image={figure} barReadings={[]} onDone={close} /> : null}
      <Facts number={number} figure={figure} />
      {open === 'description' ? (
        <DescribeForm number={number} figure={figure} onDone={close} />
      ) : (
        <p className="mt-4">
          <Button
            closedBecause={mayDescribe.allowed ? undefined : mayDescribe.reason}
            onClick={() => setOpen('description')}
          >
            Describe it
          </Button>
        </p>
      )}
    </section>
  );
}

function Refused({ figure }: { figure: FractographView }) {
  return (
    <Note tone="iron" className="mt-3" lead={`${figure.fileName} was refused.`}>
      {figure.refusedReason} Its name and hash stay; its bytes go after seven days.
    </Note>
  );
}

function SameBytes({ figure }: { figure: FractographView }) {
  if (figure.sameBytesAs.length === 0) return null;
  const others = figure.sameBytesAs.map(({ figureNumber }) => `Fig. ${figureNumber}`).join(' and ');
  return (
    <Note tone="ochre" className="mt-3" lead={`This is the same file as ${others}.`}>
      Every byte is equal. Both stay; say in the captions what each is for.
    </Note>
  );
}

function Scale({ figure }: { figure: FractographView }) {
  const { scale } = figure;
  if (!scale)
    return (
      <Note tone="ochre" className="mt-3" lead="Uncalibrated.">
        No length is read from this image until it is bound to a scale.
        {figure.tagPixelSizeUm === null
          ? null
          : ` The file says ${formatNumber(figure.tagPixelSizeUm)} µm per pixel (${figure.tagSource ?? 'tag'}); it waits to be looked at.`}
      </Note>
    );
  const margin = scale.stale ? (
    <StaleNote since={formatShortDay(scale.stale.since)}>
      {scale.stale.why}. Bind the image to what is in force now.
    </StaleNote>
  ) : null;
  return (
    <WithMargin margin={margin} className="mt-3">
      <p>{scaleInWords(scale)}</p>
      <p className="text-s text-ink-2">
        {scaleUncertaintyInWords(scale)}; bound by {scale.boundBy.name} on {formatDay(scale.boundAt)}.
      </p>
    </WithMargin>
  );
}

function Facts({ number, figure }: { number: string; figure: FractographView }) {
  const facts = factsOf(figure);
  const missing = missingFacts(figure);
  return (
    <div className="mt-6">
      <RuleHead small aside={figure.standing === 'record' ? 'a record' : 'a working image'}>
        What is known of it
      </RuleHead>
      <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-5 gap-y-1">
        {facts.map(([word, value]) => (
          <div key={word} className="contents">
            <dt className="text-ink-2">{word}</dt>
            <dd>{value}</dd>
          </div>
        ))}
        <dt className="text-ink-2">SHA-256</dt>
        <dd className="mono min-w-0 text-s break-all">{figure.sha256}</dd>
      </dl>
      {missing.length > 0 ? (
        <p className="mt-2 text-ochre">
          <b>Not told:</b> {missing.join(', ')}.
        </p>
      ) : null}
      <p className="mt-2">
        <a href={`/api/cases/${number}/fractographs/${figure.id}/original`} download>
          Take the original, bit for bit
        </a>
        <span className="text-s text-ink-2"> What is shown here and on the bench is made from it.</span>
      </p>
    </div>
  );
}

function factsOf(figure: FractographView): [string, string][] {
  const { instrument, objective } = figure;
  const taken = [figure.takenBy, figure.takenOn && formatDay(figure.takenOn)].filter(Boolean).join(', ');
  const piece = [figure.fragment?.code, figure.face && `face ${figure.face}`, figure.view].filter(Boolean).join(', ');
  const size = figure.widthPx && figure.heightPx ? `${figure.widthPx} × ${figure.heightPx} px, ` : '';
  const all: [string, string | null][] = [
    ['File', `${size}${figure.format ?? ''}${figure.format ? ', ' : ''}${sizeInWords(figure.bytes)}`],
    ['Shows', piece],
    ['Taken with', [instrument?.name, objective].filter(Boolean).join(', ')],
    ['Field width', figure.fieldWidthMm === null ? null : `${formatNumber(figure.fieldWidthMm)} mm`],
    ['Tilt', figure.tiltDeg === null ? null : `${formatNumber(figure.tiltDeg)}°`],
    ['Light', figure.illumination],
    ['Detector', figure.detector],
    ['Coating', figure.coating],
    ['Taken', taken],
    ['Brought in', `${figure.broughtInBy.name}, ${formatDay(figure.broughtInAt)}`],
  ];
  return all.flatMap(([word, value]) => (value ? [[word, value] as [string, string]] : []));
}
