import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useFieldArray, useForm } from 'react-hook-form';
import { QuestionsAgreed, QuestionsView } from '#shared/contracts/cases.ts';
import { Refusal } from '#src/http/api.ts';
import { BothVersions } from '#src/ui/both-versions.tsx';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useCaseAct } from '../api.ts';

type AskedFormProps = { number: string; newest: QuestionsView | null; onLeave: () => void };

/** Writes the next version of what was asked. */
export function AskedForm({ number, newest, onLeave }: AskedFormProps) {
  const act = useCaseAct(number);
  const [startedFrom] = useState(newest);
  const form = useForm<QuestionsAgreed>({
    resolver: zodResolver(QuestionsAgreed),
    defaultValues: {
      questions: startedFrom?.questions ?? [{ key: crypto.randomUUID(), text: '' }],
      besideScope: startedFrom?.besideScope ?? '',
      reason: '',
      versionSeen: startedFrom?.version ?? 0,
    },
  });
  const lines = useFieldArray({ control: form.control, name: 'questions' });
  const { errors } = form.formState;
  const keep = (agreed: QuestionsAgreed) =>
    act.mutate({ method: 'POST', path: '/questions', body: agreed }, { onSuccess: onLeave });
  const theirs = act.error instanceof Refusal ? QuestionsView.safeParse(act.error.body.current).data : undefined;
  return (
    <form onSubmit={(event) => void form.handleSubmit(keep)(event)} className="grid gap-3 pt-2">
      {lines.fields.map((line, index) => (
        <div key={line.id} className="flex items-end gap-2">
          <TextField
            label={`Question ${index + 1}`}
            error={errors.questions?.[index]?.text?.message}
            className="flex-1"
            {...form.register(`questions.${index}.text`)}
          />
          <Button small kind="plain" className="mb-1" onClick={() => lines.remove(index)}>
            Take it out
          </Button>
        </div>
      ))}
      <div>
        <Button small onClick={() => lines.append({ key: crypto.randomUUID(), text: '' })}>
          Add a question
        </Button>
      </div>
      <TextArea
        label="Beside the scope"
        help="What was asked and is not for the laboratory to answer, and to whom it was said."
        rows={2}
        {...form.register('besideScope')}
      />
      {startedFrom ? (
        <TextField
          label="Why it is changed"
          error={errors.reason?.message ?? refusalAt(act.error, 'reason')}
          {...form.register('reason')}
        />
      ) : null}
      {act.error && !theirs && !refusalAt(act.error, 'reason') ? (
        <FieldError id="asked-error">{act.error.message}</FieldError>
      ) : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={act.isPending}>
          Agree version {(startedFrom?.version ?? 0) + 1}
        </Button>
        <Button onClick={onLeave}>Leave it as it was</Button>
      </div>
      {theirs ? (
        <BothVersions
          title={`What was asked of ${number} was changed while you wrote`}
          rows={versionRows(theirs, form.getValues())}
          onKeepMine={() => keep({ ...form.getValues(), versionSeen: theirs.version })}
          onTakeTheirs={onLeave}
        />
      ) : null}
    </form>
  );
}

function versionRows(theirs: QuestionsView, mine: QuestionsAgreed) {
  const texts = (of: { questions: readonly { text: string }[] }) => of.questions.map(({ text }) => text).join(' · ');
  return [
    { label: 'Questions', theirs: texts(theirs), mine: texts(mine), differs: texts(theirs) !== texts(mine) },
    {
      label: 'Beside the scope',
      theirs: theirs.besideScope,
      mine: mine.besideScope,
      differs: theirs.besideScope !== mine.besideScope,
    },
  ];
}

function refusalAt(error: Error | null, field: string): string | undefined {
  return error instanceof Refusal && error.body.field === field ? error.body.message : undefined;
}
