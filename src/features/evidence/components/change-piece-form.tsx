import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { PieceChange, PieceView } from '#shared/contracts/evidence.ts';
import { fragmentStatuses } from '#shared/vocabulary/pieces.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm, FieldPair } from './act-form.tsx';
import { BothVersions } from './both-versions.tsx';
import { OriginOptions } from './origin-options.tsx';
import { linesOfPiece, sentOf, typedPiece, type PieceTyped } from './piece-lines.ts';
import { statusWords } from './piece-words.ts';
import { showAtFields, staleRowOf } from './refusal-at-fields.ts';

type ChangePieceFormProps = { number: string; piece: PieceView; onDone: () => void };

const fieldNames = [
  'description',
  'mass',
  'place',
  'holder',
  'condition',
  'receivedOn',
  'missingReason',
  'originLies',
] as const;

/** Changes what is known of a piece: where it is, who has it, whether it is there at all. */
export function ChangePieceForm({ number, piece, onDone }: ChangePieceFormProps) {
  const form = useForm<PieceTyped>({
    resolver: zodResolver(PieceChange, undefined, { raw: true }),
    defaultValues: typedPiece(piece),
  });
  const { mutate, reset, error, isPending } = useEvidenceAct(number);
  const status = useWatch({ control: form.control, name: 'status' });
  const keep = (typed: PieceTyped, version = typed.version) =>
    mutate(
      { method: 'PUT', path: `/pieces/${piece.id}`, body: { ...sentOf(typed), version }, schema: PieceView },
      { onSuccess: onDone, onError: (refused) => showAtFields(form, fieldNames, refused) },
    );
  const theirs = PieceView.safeParse(staleRowOf(error)).data;
  if (theirs) {
    const takeSome = () => {
      form.setValue('version', theirs.version);
      reset();
    };
    return (
      <BothVersions
        what={piece.code}
        lines={linesOfPiece(typedPiece(theirs), form.getValues())}
        onKeepMine={() => keep(form.getValues(), theirs.version)}
        onTakeTheirs={onDone}
        onTakeSome={takeSome}
      />
    );
  }
  const { errors } = form.formState;
  return (
    <ActForm
      title={`Change ${piece.code}`}
      aside={piece.description}
      act="Keep the change"
      error={Object.keys(errors).length > 0 ? null : error}
      isSending={isPending}
      onSubmit={(event) => void form.handleSubmit((typed) => keep(typed))(event)}
      onLeave={onDone}
    >
      <FieldPair>
        <TextField label="What it is" {...form.register('description')} error={errors.description?.message} />
        <SelectField label="It is" {...form.register('status')}>
          {fragmentStatuses.map((word) => (
            <option key={word} value={word}>
              {statusWords[word]}
            </option>
          ))}
        </SelectField>
      </FieldPair>
      {status === 'missing' ? (
        <>
          <TextField
            label="Why it is not there, and the search"
            {...form.register('missingReason')}
            error={errors.missingReason?.message}
          />
          <SelectField
            label="May the origin lie on it"
            {...form.register('originLies')}
            error={errors.originLies?.message}
          >
            <OriginOptions />
          </SelectField>
        </>
      ) : (
        <FieldPair>
          <TextField label="Where it is" {...form.register('place')} error={errors.place?.message} />
          <TextField label="With" {...form.register('holder')} error={errors.holder?.message} />
          <TextField
            label="Mass"
            {...form.register('mass')}
            error={errors.mass?.message}
            help="With ± (k = 2) and unit: 6.412 kg ± 5 g."
          />
          <TextField
            label="Received on"
            type="date"
            {...form.register('receivedOn')}
            error={errors.receivedOn?.message}
          />
        </FieldPair>
      )}
      <TextField label="Condition" {...form.register('condition')} error={errors.condition?.message} />
    </ActForm>
  );
}
