import { useState } from 'react';
import type { BarReading, FractographView } from '#shared/contracts/fractographs.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { useBindScale } from '../api.ts';
import {
  emptyScaleFields,
  readScaleFields,
  type FieldFault,
  type ScaleFields,
  type ScaleWay,
} from '../scale-fields.ts';
import { ScaleWayFields } from './scale-way-fields.tsx';

type ScaleFormProps = {
  number: string;
  image: FractographView;
  /** Readings drawn along the burned-in bar on the bench, image px; empty elsewhere. */
  barReadings: readonly BarReading[];
  /** Asks the bench to let one draw along the bar; without it the form leads to the bench. */
  onDrawBar?: () => void;
  /** Takes the drawn readings away, to read the bar afresh. */
  onClearBar?: () => void;
  /** Called with the bound image, or with nothing where one left the form. */
  onDone: (bound?: FractographView) => void;
};

const ways: readonly { way: ScaleWay; words: string }[] = [
  { way: 'burned bar', words: 'Read the bar on the image' },
  { way: 'file tags', words: 'Confirm what the file says' },
  { way: 'kept calibration', words: 'Take a kept calibration' },
  { way: 'typed', words: 'Type the pixel size' },
];

/** Gives an image its scale, in one of four ways. Ways that disagree are shown and need a reason before they bind. */
export function ScaleForm(props: ScaleFormProps) {
  const { number, image, barReadings, onDone } = props;
  const [fields, setFields] = useState<ScaleFields>(() => emptyScaleFields(image));
  const [reason, setReason] = useState('');
  const [fault, setFault] = useState<FieldFault | null>(null);
  const { mutate, error, isPending, reset } = useBindScale(number, image.id);
  const refused = error instanceof Refusal ? error.body : null;
  const asksFirst = refused?.field === 'confirm' || (refused?.field === 'reason' && refused.fields !== undefined);
  const owesReason = asksFirst || image.scale !== null || refused?.field === 'reason';
  const change = (changed: Partial<ScaleFields>) => {
    setFields({ ...fields, ...changed });
    setFault(null);
    reset();
  };
  const bind = () => {
    const reading = readScaleFields(fields, image, barReadings);
    if ('why' in reading) return setFault(reading);
    const bindingSeen = image.scale?.bindingId ?? null;
    mutate(
      { reading, bindingSeen, confirmed: asksFirst, reason },
      { onSuccess: (bound) => onDone(bound ?? undefined) },
    );
  };
  return (
    <form
      noValidate
      className="mt-6"
      onSubmit={(event) => {
        event.preventDefault();
        bind();
      }}
    >
      <RuleHead small aside={image.scale ? 'all that was read with the old one turns stale' : null}>
        The scale of Fig. {image.figureNumber}
      </RuleHead>
      <fieldset className="mt-3 flex flex-col gap-1">
        <legend className="sr-only">Way to the scale</legend>
        {ways.map(({ way, words }) => (
          <label key={way} className="flex items-baseline gap-2">
            <input type="radio" name="way" checked={fields.way === way} onChange={() => change({ way })} />
            <span>{words}</span>
          </label>
        ))}
      </fieldset>
      <div className="mt-4 flex flex-col gap-4">
        <ScaleWayFields {...props} fields={fields} fault={fault} onChange={change} />
        {fault?.field === 'readings' ? <FieldError id="readings-fault">{fault.why}</FieldError> : null}
        {asksFirst && refused ? <Doubts fields={refused.fields ?? {}} /> : null}
        {owesReason ? (
          <TextArea
            label={asksFirst ? 'Why this one is right all the same' : 'Why the scale changes'}
            rows={2}
            value={reason}
            onChange={(event) => setReason(event.currentTarget.value)}
            error={refused?.field === 'reason' ? refused.message : undefined}
          />
        ) : null}
        {error && !asksFirst && refused?.field !== 'reason' ? <NotBound error={error} /> : null}
        <div className="acts">
          <Button type="submit" kind="main" disabled={isPending}>
            {asksFirst ? 'Bind it all the same' : 'Bind the scale'}
          </Button>
          <Button kind="plain" onClick={() => onDone()}>
            Leave it
          </Button>
        </div>
      </div>
    </form>
  );
}

function Doubts({ fields }: { fields: Record<string, string> }) {
  return (
    <Note tone="ochre" alert lead="Two ways to this scale disagree.">
      <ul className="mt-1 list-disc pl-5">
        {Object.values(fields).map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
      Nothing was bound yet.
    </Note>
  );
}

function NotBound({ error }: { error: Error }) {
  const holds = error instanceof Refusal ? error.body.stillHolds : undefined;
  return (
    <Note tone="iron" alert lead={error.message}>
      {holds ?? 'Nothing was lost: what you typed is still here.'}
    </Note>
  );
}
