import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { CaseOpened, CaseView } from '#shared/contracts/cases.ts';
import { Refusal } from '#src/http/api.ts';
import { BothVersions } from '#src/ui/both-versions.tsx';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { caseChoices, useCaseAct } from '../api.ts';
import { CaseFields } from './case-fields.tsx';

const Facts = CaseOpened.pick({ title: true, summary: true, kind: true, urgency: true }).extend({
  materialId: z.string(),
});
type Facts = z.infer<typeof Facts>;

const labels = { title: 'Title', summary: 'What happened', kind: 'Kind', urgency: 'Urgency' } as const;

/** Changes what the case says of itself. */
export function HappenedForm({ view, onLeave }: { view: CaseView; onLeave: () => void }) {
  const act = useCaseAct(view.number);
  const { data: choices } = useQuery(caseChoices);
  const [started] = useState(view);
  const { title, summary, kind, urgency } = started;
  const form = useForm<Facts>({
    resolver: zodResolver(Facts),
    defaultValues: { title, summary, kind, urgency, materialId: started.material?.id ?? '' },
  });
  const keep = (facts: Facts, versionSeen: number) => {
    const materialId = facts.materialId === '' ? null : facts.materialId;
    act.mutate({ method: 'PATCH', path: '', body: { ...facts, materialId, versionSeen } }, { onSuccess: onLeave });
  };
  const theirs = act.error instanceof Refusal ? CaseView.safeParse(act.error.body.current).data : undefined;
  const mine = form.getValues();
  const urgencyTyped = useWatch({ control: form.control, name: 'urgency' });
  return (
    <form
      onSubmit={(event) => void form.handleSubmit((facts) => keep(facts, started.version))(event)}
      className="grid gap-3 pt-2"
    >
      <CaseFields
        register={(name) => form.register(name)}
        errors={form.formState.errors}
        materials={choices?.materials ?? (started.material ? [started.material] : [])}
        exposed={urgencyTyped === 'exposed now'}
      />
      {act.error && !theirs ? <FieldError id="happened-error">{act.error.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={act.isPending}>
          Keep the change
        </Button>
        <Button onClick={onLeave}>Leave it as it was</Button>
      </div>
      {theirs ? (
        <BothVersions
          title={`The case ${view.number} was changed while you wrote`}
          rows={(['title', 'summary', 'kind', 'urgency'] as const).map((field) => ({
            label: labels[field],
            theirs: theirs[field],
            mine: mine[field],
            differs: theirs[field] !== mine[field],
          }))}
          onKeepMine={() => keep(mine, theirs.version)}
          onTakeTheirs={onLeave}
        />
      ) : null}
    </form>
  );
}
