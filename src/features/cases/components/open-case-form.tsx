import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { CaseOpened, type CaseChoices } from '#shared/contracts/cases.ts';
import { Button } from '#src/ui/button.tsx';
import { ButtonLink } from '#src/ui/button-link.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { useOpenCase } from '../api.ts';
import { CaseFields } from './case-fields.tsx';

const Typed = CaseOpened.omit({ materialId: true, questions: true }).extend({
  materialId: z.string(),
  asked: z.string().max(5000),
});
type Typed = z.infer<typeof Typed>;

type OpenCaseFormProps = { choices: CaseChoices; onOpened: (number: string | null) => void };

/** Takes in a case: what broke, who asks, and what they ask. */
export function OpenCaseForm({ choices, onOpened }: OpenCaseFormProps) {
  const open = useOpenCase();
  const [keys] = useState(() => Array.from({ length: 20 }, () => crypto.randomUUID()));
  const form = useForm<Typed>({
    resolver: zodResolver(Typed),
    defaultValues: {
      ...{ title: '', summary: '', kind: 'service part', urgency: 'routine' },
      ...{ organisationId: '', materialId: '', asked: '' },
    },
  });
  const { errors } = form.formState;
  const urgencyTyped = useWatch({ control: form.control, name: 'urgency' });
  const send = ({ asked, materialId, ...facts }: Typed) => {
    const texts = asked.split('\n').map((text) => text.trim());
    const questions = texts.filter((text) => text !== '').map((text, index) => ({ key: keys[index] ?? text, text }));
    open.mutate(
      { ...facts, materialId: materialId === '' ? null : materialId, questions },
      { onSuccess: (opened) => onOpened(opened?.number ?? null) },
    );
  };
  return (
    <form onSubmit={(event) => void form.handleSubmit(send)(event)} className="grid gap-4" noValidate>
      <CaseFields
        register={(name) => form.register(name)}
        errors={errors}
        materials={choices.materials}
        exposed={urgencyTyped === 'exposed now'}
      />
      <SelectField
        label="Who asks"
        help="They follow the state of the case in plain words, and nothing else."
        error={errors.organisationId?.message}
        {...form.register('organisationId')}
      >
        <option value="">choose an organisation</option>
        {choices.organisations.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <TextArea
        label="What is asked"
        help="One question a line, as the requester put it. They are agreed as version 1 and can be changed with a reason."
        rows={4}
        error={errors.asked?.message}
        {...form.register('asked')}
      />
      {open.error ? <FieldError id="open-error">{open.error.message}</FieldError> : null}
      <div className="acts">
        <Button type="submit" kind="main" disabled={open.isPending}>
          Open the case
        </Button>
        <ButtonLink to="/">Leave without opening</ButtonLink>
      </div>
    </form>
  );
}
