import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { FractographView } from '#shared/contracts/fractographs.ts';
import { fractographStandings, fractographViews } from '#shared/vocabulary/fractographs.ts';
import { faces } from '#shared/vocabulary/pieces.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { instrumentsOffered, piecesOffered, useDescribe } from '../api.ts';
import { fieldsOf, readDescription, type DescribeFields } from '../describe-fields.ts';
import { DescribedMeanwhile } from './described-meanwhile.tsx';

type DescribeFormProps = { number: string; figure: FractographView; onDone: () => void };

/** What a person says of a fractograph: what it shows and how it was taken. What is not known is left empty. */
export function DescribeForm({ number, figure, onDone }: DescribeFormProps) {
  const form = useForm<DescribeFields>({ defaultValues: fieldsOf(figure) });
  const [versionSeen, setVersionSeen] = useState(figure.version);
  const { mutate, reset, error, isPending } = useDescribe(number, figure.id);
  const pieces = useQuery(piecesOffered(number));
  const instruments = useQuery(instrumentsOffered);
  const { register, formState } = form;
  const keep = (typed: DescribeFields, version = versionSeen) => {
    const read = readDescription(typed);
    if ('why' in read) return form.setError(read.field, { message: read.why });
    mutate({ ...read, versionSeen: version }, { onSuccess: onDone });
  };
  const theirs = theirsOf(error);
  if (theirs)
    return (
      <DescribedMeanwhile
        theirs={theirs}
        mine={form.getValues()}
        onKeepMine={() => keep(form.getValues(), theirs.version)}
        onTakeTheirs={onDone}
        onTakeSome={() => {
          setVersionSeen(theirs.version);
          reset();
        }}
      />
    );
  const said = (name: keyof DescribeFields) => formState.errors[name]?.message;
  return (
    <form noValidate className="mt-6" onSubmit={(event) => void form.handleSubmit((typed) => keep(typed))(event)}>
      <RuleHead small>Describe Fig. {figure.figureNumber}</RuleHead>
      <div className="mt-3 grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">
        <TextArea label="Caption" rows={2} className="col-span-full" {...register('caption')} error={said('caption')} />
        <SelectField label="Piece" {...register('fragmentId')} error={said('fragmentId')}>
          <option value="">not told</option>
          {pieces.data?.pieces.map(({ id, code, description }) => (
            <option key={id} value={id}>
              {code} {description}
            </option>
          ))}
        </SelectField>
        <Words label="Face" name="face" words={faces} register={register} />
        <Words label="View" name="view" words={fractographViews} register={register} />
        <SelectField label="Standing" {...register('standing')} help="A working image is not quoted.">
          {fractographStandings.map((word) => (
            <option key={word}>{word}</option>
          ))}
        </SelectField>
        <SelectField label="Instrument" {...register('instrumentId')} error={said('instrumentId')}>
          <option value="">not told</option>
          {instruments.data?.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <TextField label="Objective or magnification" {...register('objective')} error={said('objective')} />
        <TextField
          label="Field width"
          {...register('fieldWidth')}
          error={said('fieldWidth')}
          help="In mm, or with its unit: 850 µm"
        />
        <TextField label="Tilt, degrees" inputMode="decimal" {...register('tilt')} error={said('tilt')} />
        <TextField label="Light" {...register('illumination')} error={said('illumination')} />
        <TextField label="Detector" {...register('detector')} error={said('detector')} />
        <TextField label="Coating" {...register('coating')} error={said('coating')} help="none is an answer, too" />
        <TextField label="Taken by" {...register('takenBy')} error={said('takenBy')} />
        <TextField label="Taken on" type="date" {...register('takenOn')} error={said('takenOn')} />
      </div>
      {error ? <NotKept error={error} /> : null}
      <div className="acts mt-4">
        <Button type="submit" kind="main" disabled={isPending}>
          Keep the description
        </Button>
        <Button kind="plain" onClick={onDone}>
          Leave it
        </Button>
      </div>
    </form>
  );
}

type WordsProps = {
  label: string;
  name: 'face' | 'view';
  words: readonly string[];
  register: ReturnType<typeof useForm<DescribeFields>>['register'];
};

function Words({ label, name, words, register }: WordsProps) {
  return (
    <SelectField label={label} {...register(name)}>
      <option value="">not told</option>
      {words.map((word) => (
        <option key={word}>{word}</option>
      ))}
    </SelectField>
  );
}

function NotKept({ error }: { error: Error }) {
  const holds = error instanceof Refusal ? error.body.stillHolds : undefined;
  return (
    <Note tone="iron" alert className="mt-4" lead={error.message}>
      {holds ?? 'Nothing was lost: what you typed is still here.'}
    </Note>
  );
}

function theirsOf(error: Error | null): FractographView | undefined {
  if (!(error instanceof Refusal) || error.body.code !== 'stale-version') return undefined;
  return FractographView.safeParse(error.body.current).data;
}
