import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { PasswordChange } from '#shared/contracts/people.ts';
import { leastPasswordLength, passwordFault } from '#shared/rules/password-fault.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { Kept } from '#src/ui/kept.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useOwnActs } from '../api.ts';

/** Changes one's own password, with the current one; the other machines are signed out. */
export function OwnPasswordForm({ owner }: { owner: { name: string; mail: string } }) {
  const { changePassword } = useOwnActs();
  const { register, handleSubmit, setError, reset, formState } = useForm<PasswordChange>({
    resolver: zodResolver(PasswordChange),
    defaultValues: { current: '', password: '' },
  });
  const { errors } = formState;
  const submit = handleSubmit(async (change) => {
    const fault = passwordFault(change.password, owner);
    if (fault) return setError('password', { message: fault });
    try {
      await changePassword.mutateAsync(change);
      reset();
    } catch (failure) {
      const field = failure instanceof Refusal && failure.body.field === 'password' ? 'password' : 'current';
      setError(field, { message: failure instanceof Error ? failure.message : 'It was not kept; try again.' });
    }
  });
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="mt-3 flex flex-col gap-4">
      <input type="hidden" autoComplete="username" value={owner.mail} readOnly />
      <TextField
        label="Current password"
        type="password"
        autoComplete="current-password"
        error={errors.current?.message}
        {...register('current')}
      />
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        error={errors.password?.message}
        help={`At least ${leastPasswordLength} characters, without your name or mail address.`}
        {...register('password')}
      />
      <div className="acts">
        <Button type="submit" disabled={changePassword.isPending}>
          Change the password
        </Button>
        {changePassword.isSuccess ? <Kept>Kept; other machines are signed out</Kept> : null}
      </div>
    </form>
  );
}
