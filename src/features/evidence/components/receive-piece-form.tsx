import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import type { z } from 'zod';
import { PieceReceived, PieceView, type PartView } from '#shared/contracts/evidence.ts';
import { fragmentWays } from '#shared/vocabulary/pieces.ts';
import { Caution } from '#src/ui/caution.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEvidenceAct } from '../api.ts';
import { ActForm, FieldPair } from './act-form.tsx';
import { fineDust } from './cautions.ts';
import { wayWords } from './piece-words.ts';
import { showAtFields } from './refusal-at-fields.ts';

type Typed = z.input<typeof PieceReceived>;

type ReceivePieceFormProps = {
  number: string;
  parts: readonly PartView[];
  pieces: readonly PieceView[];
  /** Who receives it, as first holder. */
  holder: string;
  /** Today, as 2026-06-22. */
  today: string;
  onDone: () => void;
};

const fieldNames = ['description', 'mass', 'place', 'holder', 'condition', 'receivedOn', 'partId', 'parentId'] as const;
const dusty: readonly string[] = ['cut', 'section', 'powder'];

/** Receives a piece of the part, or one made from a piece; its code is given when it is kept. */
export function ReceivePieceForm({ number, parts, pieces, holder, today, onDone }: ReceivePieceFormProps) {
  const form = useForm<Typed>({
    resolver: zodResolver(PieceReceived, undefined, { raw: true }),
    defaultValues: {
      partId: parts[0]?.id ?? '',
      parentId: '',
      way: 'break',
      description: '',
      mass: '',
      place: '',
      holder,
      condition: '',
      receivedOn: today,
    },
  });
  const { mutate, error, isPending } = useEvidenceAct(number);
  const [way, partId] = useWatch({ control: form.control, name: ['way', 'partId'] });
  const receive = (body: Typed) =>
    mutate(
      {
        method: 'POST',
        path: '/pieces',
        body: { ...body, parentId: way === 'break' ? null : body.parentId },
        schema: PieceView,
      },
      { onSuccess: onDone, onError: (refused) => showAtFields(form, fieldNames, refused) },
    );
  const { errors } = form.formState;
  const sources = pieces.filter((piece) => piece.partId === partId && piece.status !== 'missing');
  return (
    <ActForm
      title="Receive a piece"
      aside="its number is given when it is kept"
      act="Receive the piece"
      error={Object.keys(errors).length > 0 ? null : error}
      isSending={isPending}
      onSubmit={(event) => void form.handleSubmit(receive)(event)}
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
      <FieldPair>
        <SelectField label="How it was made" {...form.register('way')}>
          {fragmentWays.map((word) => (
            <option key={word} value={word}>
              {wayWords[word]}
            </option>
          ))}
        </SelectField>
        {way === 'break' ? null : (
          <SelectField label="From which piece" {...form.register('parentId')} error={errors.parentId?.message}>
            <option value="">choose the piece</option>
            {sources.map(({ id, code, description }) => (
              <option key={id} value={id}>
                {code}, {description}
              </option>
            ))}
          </SelectField>
        )}
      </FieldPair>
      <TextField label="What it is" {...form.register('description')} error={errors.description?.message} />
      <FieldPair>
        <TextField
          label="Mass"
          {...form.register('mass')}
          error={errors.mass?.message}
          help="With ± (k = 2) and unit: 6.412 kg ± 5 g. Empty while not weighed."
        />
        <TextField
          label="Received on"
          type="date"
          {...form.register('receivedOn')}
          error={errors.receivedOn?.message}
        />
        <TextField
          label="Where it is"
          {...form.register('place')}
          error={errors.place?.message}
          help="Safe S2, bench 1."
        />
        <TextField label="With" {...form.register('holder')} error={errors.holder?.message} />
      </FieldPair>
      <TextField
        label="Condition"
        {...form.register('condition')}
        error={errors.condition?.message}
        help="As received: wrapped or loose, clean or not, chipped edges."
      />
      {dusty.includes(way) ? <Caution lead={fineDust.lead}>{fineDust.text}</Caution> : null}
    </ActForm>
  );
}
