import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { InstrumentEntered, InstrumentView } from '#shared/contracts/calibrations.ts';
import { instrumentKinds } from '#shared/vocabulary/instrument-kinds.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useInstrumentAct } from '../calibrations-api.ts';

/** Enters an instrument, for which calibrations may then be kept. */
export function InstrumentForm({ onDone }: { onDone: () => void }) {
  const { register, handleSubmit, formState } = useForm<InstrumentEntered>({
    resolver: zodResolver(InstrumentEntered),
    defaultValues: { name: '', kind: 'stereo' },
  });
  const { mutate, error, isPending } = useInstrumentAct('/laboratory/instruments', InstrumentView);
  const submit = handleSubmit((entered) => mutate(entered, { onSuccess: onDone }));
  return (
    <form noValidate className="mt-6" onSubmit={(event) => void submit(event)}>
      <RuleHead small>Enter an instrument</RuleHead>
      <div className="mt-3 grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">
        <TextField label="Name" {...register('name')} error={formState.errors.name?.message} />
        <SelectField label="Kind" {...register('kind')}>
          {instrumentKinds.map((kind) => (
            <option key={kind}>{kind}</option>
          ))}
        </SelectField>
      </div>
      {error ? (
        <Note tone="iron" alert className="mt-4" lead={error.message}>
          Nothing was lost: what you typed is still here.
        </Note>
      ) : null}
      <div className="acts mt-4">
        <Button type="submit" kind="main" disabled={isPending}>
          Keep the instrument
        </Button>
        <Button kind="plain" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
