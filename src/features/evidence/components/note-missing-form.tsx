import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { MissingNoted, PieceView, type PartView } from '#shared/contracts/evidence.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm } from './act-form.tsx';
import { OriginOptions } from './origin-options.tsx';
import { showAtFields } from './refusal-at-fields.ts';

type NoteMissingFormProps = { number: string; parts: readonly PartView[]; onDone: () => void };

/** What the form holds: the answer about the origin is empty until one is chosen. */
type Typed = z.input<typeof MissingNoted>;

const fieldNames = ['description', 'missingReason', 'originLies', 'partId'] as const;

/** Notes a piece that is not there, why, and whether the origin may lie on it. */
export function NoteMissingForm({ number, parts, onDone }: NoteMissingFormProps) {
  const form = useForm<Typed>({
    resolver: zodResolver(MissingNoted, undefined, { raw: true }),
    defaultValues: { partId: parts[0]?.id ?? '', description: '', missingReason: '', originLies: '' },
  });
  const { mutate, error, isPending } = useEvidenceAct(number);
  const note = (body: Typed) =>
    mutate(
      { method: 'POST', path: '/missing', body, schema: PieceView },
      { onSuccess: onDone, onError: (refused) => showAtFields(form, fieldNames, refused) },
    );
  const { errors } = form.formState;
  return (
    <ActForm
      title="Note what is missing"
      aside="its number begins with M"
      act="Note the missing piece"
      error={Object.keys(errors).length > 0 ? null : error}
      isSending={isPending}
      onSubmit={(event) => void form.handleSubmit(note)(event)}
      onLeave={onDone}
    >
      {parts.length > 1 ? (
        <SelectField label="Of which part" {...form.register('partId')} error={errors.partId?.message}>
          {parts.map(({ id, description }) => (
            <option key={id} value={id}>
              {description}
            </option>
          ))}
        </SelectField>
      ) : null}
      <TextField label="What it is" {...form.register('description')} error={errors.description?.message} />
      <TextField
        label="Why it is not there, and the search"
        {...form.register('missingReason')}
        error={errors.missingReason?.message}
        help="Not found on site after two searches; swept up with the yard."
      />
      <SelectField
        label="May the origin lie on it"
        {...form.register('originLies')}
        error={errors.originLies?.message}
        help="While it may, or is not known, a limit stands in the findings."
      >
        <OriginOptions />
      </SelectField>
    </ActForm>
  );
}
