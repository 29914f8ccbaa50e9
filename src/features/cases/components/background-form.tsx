import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { BackgroundGiven, BackgroundView } from '#shared/contracts/cases.ts';
import { standings } from '#shared/vocabulary/case-states.ts';
import { Refusal } from '#src/http/api.ts';
import { BothVersions } from '#src/ui/both-versions.tsx';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useCaseAct } from '../api.ts';

type BackgroundFormProps = { number: string; statement: BackgroundView | null; onLeave: () => void };

const fields = ['statement', 'standing', 'source', 'givenOn'] as const;
const labels = { statement: 'Statement', standing: 'Standing', source: 'Source', givenOn: 'Given on' } as const;

/** Adds a statement, changes it, or takes it back with a reason. */
export function BackgroundForm({ number, statement, onLeave }: BackgroundFormProps) {
  const act = useCaseAct(number);
  const [takingBack, setTakingBack] = useState<string | null>(null);
  const form = useForm<BackgroundGiven>({
    resolver: zodResolver(BackgroundGiven),
    defaultValues: statement ?? { statement: '', standing: 'told', source: '', givenOn: '' },
  });
  const { errors } = form.formState;
  const done = { onSuccess: onLeave };
  const keep = (given: BackgroundGiven, versionSeen = statement?.version) =>
    statement
      ? act.mutate({ method: 'PUT', path: `/background/${statement.id}`, body: { ...given, versionSeen } }, done)
      : act.mutate({ method: 'POST', path: '/background', body: given }, done);
  const takeBack = (reason: string) =>
    act.mutate(
      { method: 'DELETE', path: `/background/${statement?.id}`, body: { reason, versionSeen: statement?.version } },
      done,
    );
  const theirs = act.error instanceof Refusal ? BackgroundView.safeParse(act.error.body.current).data : undefined;
  return (
    <form onSubmit={(event) => void form.handleSubmit((given) => keep(given))(event)} className="mt-3 grid gap-3">
      <TextArea label="Statement" rows={2} error={errors.statement?.message} {...form.register('statement')} />
      <div className="grid grid-cols-[130px_1fr_160px] gap-3 narrow:grid-cols-1">
        <SelectField label="Standing" {...form.register('standing')}>
          {standings.map((standing) => (
            <option key={standing}>{standing}</option>
          ))}
        </SelectField>
        <TextField label="Source" error={errors.source?.message} {...form.register('source')} />
        <TextField label="Given on" type="date" error={errors.givenOn?.message} {...form.register('givenOn')} />
      </div>
      {act.error && !theirs ? <FieldError id="background-error">{act.error.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={act.isPending}>
          {statement ? 'Keep the change' : 'Add the statement'}
        </Button>
        <Button onClick={onLeave}>Leave it as it was</Button>
        {statement && takingBack === null ? (
          <Button kind="plain" onClick={() => setTakingBack('')}>
            Take it back
          </Button>
        ) : null}
      </div>
      {takingBack === null ? null : (
        <div className="flex items-end gap-2">
          <TextField
            label="Why it is taken back"
            value={takingBack}
            onChange={(event) => setTakingBack(event.target.value)}
            className="flex-1"
          />
          <Button kind="iron" disabled={takingBack.trim() === ''} onClick={() => takeBack(takingBack)}>
            Take the statement back
          </Button>
        </div>
      )}
      {theirs ? (
        <BothVersions
          title="This statement was changed while you wrote"
          rows={fields.map((field) => {
            const mine = form.getValues(field);
            return { label: labels[field], theirs: theirs[field], mine, differs: theirs[field] !== mine };
          })}
          onKeepMine={() => keep(form.getValues(), theirs.version)}
          onTakeTheirs={onLeave}
        />
      ) : null}
    </form>
  );
}
