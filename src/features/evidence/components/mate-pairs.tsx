import { useState } from 'react';
import { MatePairView } from '#shared/contracts/evidence.ts';
import { asSentence } from '#shared/wording/number-words.ts';
import { Button } from '#src/ui/button.tsx';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm } from './act-form.tsx';
import { facePictures, type FacePicture } from './face-pictures.ts';

type MatePairsProps = {
  number: string;
  mates: readonly MatePairView[];
  /** Fractographs of faces that can be shown. */
  pictures: readonly FacePicture[];
  mayChange: boolean;
};

/** Faces that were one before the break, side by side. */
export function MatePairs({ number, mates, pictures, mayChange }: MatePairsProps) {
  return (
    <div className="mb-5">
      <RuleHead small>Mating faces</RuleHead>
      {mates.length === 0 ? <p className="mt-2 text-ink-2">No faces are paired yet.</p> : null}
      {mates.map((pair) => (
        <MatePair key={pair.id} number={number} pair={pair} pictures={pictures} mayChange={mayChange} />
      ))}
    </div>
  );
}

type MatePairProps = { number: string; pair: MatePairView; pictures: readonly FacePicture[]; mayChange: boolean };

function MatePair({ number, pair, pictures, mayChange }: MatePairProps) {
  const [mirrored, setMirrored] = useState(true);
  const [parting, setParting] = useState(false);
  const [one, other] = facePictures(pair, pictures);
  const bothShown = one !== null && other !== null;
  return (
    <div className="mt-3">
      <div className="grid grid-cols-2 gap-1">
        <FacePlate face={pair.one} picture={one} mirrored={false} />
        <FacePlate face={pair.other} picture={other} mirrored={mirrored && bothShown} />
      </div>
      <div className="mt-2 flex flex-wrap items-baseline justify-between gap-x-4">
        <span className="text-s text-ink-2">
          {pair.crack ? `${asSentence(pair.crack)}; paired by ` : 'Paired by '}
          {pair.pairedBy.name}.
        </span>
        <span className="acts">
          {bothShown ? (
            <Button kind="plain" small aria-pressed={mirrored} onClick={() => setMirrored(!mirrored)}>
              {mirrored ? 'Show the mate as taken' : 'Show the mate mirrored'}
            </Button>
          ) : null}
          {mayChange && !parting ? (
            <Button kind="plain" small onClick={() => setParting(true)}>
              Part these faces
            </Button>
          ) : null}
        </span>
      </div>
      {parting ? <PartFacesForm number={number} pair={pair} onDone={() => setParting(false)} /> : null}
    </div>
  );
}

type FacePlateProps = { face: MatePairView['one']; picture: FacePicture | null; mirrored: boolean };

function FacePlate({ face, picture, mirrored }: FacePlateProps) {
  const name = `${face.code}, face ${face.face}`;
  return (
    <figure className="flex min-w-0 flex-col">
      {picture ? (
        <img
          src={picture.src}
          alt={`${name}: ${picture.caption === '' ? 'fractograph' : picture.caption}`}
          className={`aspect-[3/2] w-full bg-plate object-cover ${mirrored ? '-scale-x-100' : ''}`}
        />
      ) : (
        <div className="flex h-full min-h-[74px] items-center justify-center border border-dashed border-control px-3 text-center text-s text-ink-2">
          No fractograph of this face yet
        </div>
      )}
      <FigureCaption number={picture ? `Fig. ${picture.figureNumber}` : undefined}>
        {name}
        {mirrored ? ', mirrored' : ''}
      </FigureCaption>
    </figure>
  );
}

function PartFacesForm({ number, pair, onDone }: { number: string; pair: MatePairView; onDone: () => void }) {
  const [reason, setReason] = useState('');
  const { mutate, error, isPending } = useEvidenceAct(number);
  return (
    <ActForm
      title="Part these faces"
      aside="the pair stays on record"
      act="Part the faces"
      error={error}
      isSending={isPending}
      onSubmit={(event) => {
        event.preventDefault();
        const body = { version: pair.version, reason };
        mutate(
          { method: 'POST', path: `/mates/${pair.id}/parting`, body, schema: MatePairView },
          { onSuccess: onDone },
        );
      }}
      onLeave={onDone}
    >
      <TextField label="Why they do not belong together" value={reason} onChange={(e) => setReason(e.target.value)} />
    </ActForm>
  );
}
