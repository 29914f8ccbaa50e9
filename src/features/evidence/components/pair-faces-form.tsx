import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { FacesPaired, MatePairView, type PieceView } from '#shared/contracts/evidence.ts';
import { faces } from '#shared/vocabulary/pieces.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm, FieldPair } from './act-form.tsx';
import { showAtFields } from './refusal-at-fields.ts';

type PairFacesFormProps = { number: string; pieces: readonly PieceView[]; onDone: () => void };
type Typed = z.input<typeof FacesPaired>;

/** Pairs two faces that were one before the break. */
export function PairFacesForm({ number, pieces, onDone }: PairFacesFormProps) {
  const form = useForm<Typed>({
    resolver: zodResolver(FacesPaired, undefined, { raw: true }),
    defaultValues: {
      one: { fragmentId: '', face: 'A' },
      other: { fragmentId: '', face: 'B' },
      crack: '',
    },
  });
  const { mutate, error, isPending } = useEvidenceAct(number);
  const pair = (body: Typed) =>
    mutate(
      { method: 'POST', path: '/mates', body, schema: MatePairView },
      { onSuccess: onDone, onError: (refused) => showAtFields(form, ['one', 'other'], refused) },
    );
  const { errors } = form.formState;
  const options = pieces.map(({ id, code, description }) => (
    <option key={id} value={id}>
      {code}, {description}
    </option>
  ));
  return (
    <ActForm
      title="Pair mating faces"
      aside="two faces that were one"
      act="Pair the faces"
      error={Object.keys(errors).length > 0 ? null : error}
      isSending={isPending}
      onSubmit={(event) => void form.handleSubmit(pair)(event)}
      onLeave={onDone}
    >
      {(['one', 'other'] as const).map((side) => (
        <FieldPair key={side}>
          <SelectField
            label={side === 'one' ? 'A piece' : 'and its mate'}
            {...form.register(`${side}.fragmentId`)}
            error={errors[side]?.fragmentId?.message ?? errors[side]?.message ?? errors[side]?.root?.message}
          >
            <option value="">choose the piece</option>
            {options}
          </SelectField>
          <SelectField label="Its face" {...form.register(`${side}.face`)} error={errors[side]?.face?.message}>
            {faces.map((face) => (
              <option key={face} value={face}>
                face {face}
              </option>
            ))}
          </SelectField>
        </FieldPair>
      ))}
      <TextField
        label="Crack between them"
        {...form.register('crack')}
        error={errors.crack?.message}
        help="Its name, if it has one: c1."
      />
    </ActForm>
  );
}
