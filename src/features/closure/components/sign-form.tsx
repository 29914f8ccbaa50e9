import type { ReactNode } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { ReviewView } from '#shared/contracts/closure.ts';
import { signatureMeanings, type SignatureMeaning } from '#shared/vocabulary/signatures.ts';
import { meaningWords } from '#shared/wording/signature-meaning.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { ReviewActs } from '../api.ts';
import { RefusalNote } from './refusal-note.tsx';

type SignFormProps = {
  review: ReviewView;
  act: ReviewActs['sign'];
  meanings: readonly SignatureMeaning[];
  /** The other way out, beside the button. */
  beside: ReactNode;
};
type Fields = { meaning: SignatureMeaning; password: string };

/** What one's signature says, the password once more, and the button that signs exactly what stands on this page. */
export function SignForm({ review, act, meanings, beside }: SignFormProps) {
  const { register, handleSubmit, control, resetField, formState } = useForm<Fields>({
    defaultValues: { meaning: meanings[0], password: '' },
  });
  const meaning = useWatch({ control, name: 'meaning' });
  const { contentHash, number } = review;
  const sign = handleSubmit(({ password }) => {
    if (contentHash === null) return;
    act.mutate({ meaning, password, contentHash }, { onSettled: () => resetField('password') });
  });
  const atPassword = refusalAtPassword(act.error);
  return (
    <form noValidate onSubmit={(event) => void sign(event)} className="mt-4 flex flex-col gap-3">
      <div className="grid grid-cols-2 items-start gap-6 narrow:grid-cols-1">
        <SelectField label="Your signature says" {...register('meaning')}>
          {meanings.map((each) => (
            <option key={each} value={each}>
              {meaningWords[each]}
            </option>
          ))}
        </SelectField>
        <TextField
          label="Your password, once more"
          type="password"
          autoComplete="current-password"
          error={formState.errors.password?.message ?? atPassword}
          help={helpOf(meaning, number)}
          {...register('password', { required: 'Type your password once more.' })}
        />
      </div>
      {atPassword ? null : <RefusalNote error={act.error} />}
      <div className="acts">
        <Button type="submit" kind="main" disabled={act.isPending}>
          {meaning === 'approved' ? `Sign and close ${number}` : `Sign as ${meaning}`}
        </Button>
        {beside}
      </div>
    </form>
  );
}

function refusalAtPassword(error: Error | null): string | undefined {
  return error instanceof Refusal && error.body.field === 'password' ? error.body.message : undefined;
}

function helpOf(meaning: SignatureMeaning, number: string): string {
  return meaning === 'approved'
    ? `Signing seals ${number}. It cannot be undone, only amended.`
    : 'Your name, the time with its zone and what you say stand on every copy.';
}

/** The meanings this person may sign with now, the most telling first. */
export function meaningsFor({ acts }: ReviewView): SignatureMeaning[] {
  return [...signatureMeanings].reverse().filter((meaning) => acts.sign[meaning].allowed);
}
