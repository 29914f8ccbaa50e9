import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { zodResolver } from '@hookform/resolvers/zod';
import { CalibrationView, type InstrumentView } from '#shared/contracts/calibrations.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { UnitField } from '#src/ui/unit-field.tsx';
import { CalibrationTyped, type CalibrationFields } from '../calibration-fields.ts';
import { reachOf, useInstrumentAct } from '../calibrations-api.ts';
import { ReachWords } from './reach-words.tsx';

type CalibrationFormProps = {
  instruments: readonly InstrumentView[];
  /** The calibration to be replaced; without one a first one is entered. */
  replaces?: CalibrationView;
  /** Today, as the form's first day in force. */
  today: string;
  onDone: () => void;
};

/** Enters a calibration, or puts a new one in place of another after showing what hangs on it. */
export function CalibrationForm({ instruments, replaces, today, onDone }: CalibrationFormProps) {
  const [instrumentId, setInstrumentId] = useState(replaces?.instrument.id ?? instruments[0]?.id ?? '');
  const path = replaces ? `/laboratory/calibrations/${replaces.id}/replacement` : '/laboratory/calibrations';
  const { mutate, error, isPending } = useInstrumentAct(path, CalibrationView);
  const form = useForm<CalibrationFields, unknown, ReturnType<typeof CalibrationTyped.parse>>({
    resolver: zodResolver(CalibrationTyped),
    defaultValues: {
      ...{ setting: replaces?.setting ?? '', pixelSizeXUm: '', expandedUncertaintyPercent: '0.5', source: '' },
      ...{ asFoundErrorPercent: '', validFrom: today, reason: '' },
    },
  });
  const { register, formState } = form;
  const said = (name: keyof CalibrationFields) => formState.errors[name]?.message;
  const submit = form.handleSubmit(({ reason, ...typed }) => {
    if (replaces && reason.length < 5)
      return form.setError('reason', {
        message: 'Say why it is replaced; it stands beside every value that turns stale.',
      });
    const way = replaces?.way ?? 'graticule';
    mutate({ ...typed, way, ...(replaces ? { reason } : { instrumentId }) }, { onSuccess: onDone });
  });
  return (
    <form noValidate className="mt-6" onSubmit={(event) => void submit(event)}>
      <RuleHead small>{replaces ? `Replace ${replaces.code}` : 'Enter a calibration'}</RuleHead>
      {replaces ? <Reach calibration={replaces} /> : null}
      <div className="mt-3 grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">
        {replaces ? null : (
          <SelectField
            label="Instrument"
            value={instrumentId}
            onChange={(event) => setInstrumentId(event.currentTarget.value)}
          >
            {instruments.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </SelectField>
        )}
        <TextField label="Objective or magnification" {...register('setting')} error={said('setting')} />
        <UnitField label="Pixel size" unit="µm" entry={register('pixelSizeXUm')} error={said('pixelSizeXUm')} />
        <UnitField
          label="Its uncertainty, ± U"
          unit="%"
          entry={register('expandedUncertaintyPercent')}
          error={said('expandedUncertaintyPercent')}
          help="k = 2"
        />
        <TextField
          label="Reference"
          {...register('source')}
          error={said('source')}
          help="Graticule and its certificate"
        />
        <UnitField
          label="The one before was out by"
          unit="%"
          entry={register('asFoundErrorPercent')}
          error={said('asFoundErrorPercent')}
          help="As found; empty where none was read"
        />
        <TextField label="In force from" type="date" {...register('validFrom')} error={said('validFrom')} />
        {replaces ? (
          <TextArea label="Why" rows={2} className="col-span-full" {...register('reason')} error={said('reason')} />
        ) : null}
      </div>
      {error ? (
        <Note tone="iron" alert className="mt-4" lead={error.message}>
          Nothing was lost: what you typed is still here.
        </Note>
      ) : null}
      <div className="acts mt-4">
        <Button type="submit" kind={replaces ? 'iron' : 'main'} disabled={isPending}>
          {replaces ? `Replace ${replaces.code}` : 'Keep the calibration'}
        </Button>
        <Button kind="plain" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}

function Reach({ calibration }: { calibration: CalibrationView }) {
  const { data } = useQuery(reachOf(calibration.id));
  return data ? (
    <ReachWords code={calibration.code} reach={data} />
  ) : (
    <p className="mt-3 text-ink-2">Reading what hangs on it…</p>
  );
}
