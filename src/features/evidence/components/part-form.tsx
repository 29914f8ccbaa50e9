import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { PartView } from '#shared/contracts/evidence.ts';
import { TextField } from '#src/ui/text-field.tsx';
import { UnitField } from '#src/ui/unit-field.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm, FieldPair } from './act-form.tsx';
import { BothVersions } from './both-versions.tsx';
import { linesOfPart, typedPart } from './part-lines.ts';
import { showAtFields, staleRowOf } from './refusal-at-fields.ts';
import { PartTyped } from './typed-temperature.ts';

export type MaterialOffered = { readonly id: string; readonly name: string };

type PartFormProps = {
  number: string;
  /** The part to change; without one a new part is entered. */
  part?: PartView;
  materials: readonly MaterialOffered[];
  onDone: () => void;
};

const fieldNames = ['description', 'serial', 'drawing', 'maker', 'materialId', 'environment', 'serviceTime'] as const;

/** Enters what broke, or changes what is known of it. */
export function PartForm({ number, part, materials, onDone }: PartFormProps) {
  const form = useForm<PartTyped>({
    resolver: zodResolver(PartTyped, undefined, { raw: true }),
    defaultValues: typedPart(part ?? null),
  });
  // Of when the form was opened: the part itself is read again meanwhile.
  const [versionSeen, setVersionSeen] = useState(part?.version);
  const { mutateAsync, reset, error, isPending } = useEvidenceAct(number);
  const keep = (typed: PartTyped, version = versionSeen) => {
    const body = { ...PartTyped.parse(typed), ...(part ? { version } : {}) };
    const act = part
      ? { method: 'PUT' as const, path: `/parts/${part.id}` }
      : { method: 'POST' as const, path: '/parts' };
    // Of the promise, not of this form: the first part brings another page, on which the form no longer stands.
    mutateAsync({ ...act, body, schema: PartView }).then(onDone, (refused: Error) =>
      showAtFields(form, fieldNames, refused),
    );
  };
  const theirs = PartView.safeParse(staleRowOf(error)).data;
  if (theirs) {
    const mine = form.getValues();
    const takeSome = () => {
      setVersionSeen(theirs.version);
      reset();
    };
    return (
      <BothVersions
        what={theirs.description}
        lines={linesOfPart(typedPart(theirs), mine, materials)}
        onKeepMine={() => keep(mine, theirs.version)}
        onTakeTheirs={onDone}
        onTakeSome={takeSome}
      />
    );
  }
  const { errors } = form.formState;
  return (
    <ActForm
      title={part ? `Change ${part.description}` : 'What broke'}
      act={part ? 'Keep the change' : 'Enter the part'}
      error={Object.keys(errors).length > 0 ? null : error}
      isSending={isPending}
      onSubmit={(event) => void form.handleSubmit((typed) => keep(typed))(event)}
      onLeave={onDone}
    >
      <TextField
        label="What it is"
        {...form.register('description')}
        error={errors.description?.message}
        help="The part or specimen, as one would call it at the bench."
      />
      <FieldPair>
        <TextField label="Serial" {...form.register('serial')} error={errors.serial?.message} />
        <TextField label="Drawing" {...form.register('drawing')} error={errors.drawing?.message} />
        <TextField label="Maker" {...form.register('maker')} error={errors.maker?.message} />
        <SelectField label="Material" {...form.register('materialId')} error={errors.materialId?.message}>
          <option value="">not known yet</option>
          {materials.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <TextField
          label="Environment"
          {...form.register('environment')}
          error={errors.environment?.message}
          help="Air, water, oil, body fluid, vacuum."
        />
        <UnitField
          label="Temperature"
          unit="°C"
          entry={form.register('temperatureC')}
          error={errors.temperatureC?.message}
        />
        <TextField
          label="Service time"
          {...form.register('serviceTime')}
          error={errors.serviceTime?.message}
          help="With its unit: 4 300 h, 11 years, 2 cycles."
        />
      </FieldPair>
    </ActForm>
  );
}
