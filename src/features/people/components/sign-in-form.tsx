import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { SignIn, type SessionView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { signIn } from '../api.ts';

/** Mail address and password. What was wrong stands under the password and never says which of the two it was. */
export function SignInForm({ onSignedIn }: { onSignedIn: (session: SessionView) => void }) {
  const { register, handleSubmit, setError, formState } = useForm<SignIn>({ resolver: zodResolver(SignIn) });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (tried) => {
    try {
      onSignedIn(await signIn(tried));
    } catch (failure) {
      const message = failure instanceof Error ? failure.message : 'The sign-in failed; try again.';
      setError('password', { message }, { shouldFocus: true });
    }
  });
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-5">
      <TextField
        label="Mail address"
        type="email"
        autoComplete="username"
        autoFocus
        error={errors.mail?.message}
        {...register('mail')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errors.password?.message}
        {...register('password')}
      />
      <div className="acts mt-1">
        <Button type="submit" kind="main" disabled={isSubmitting}>
          Sign in
        </Button>
        <Link to="/password">Set a new password</Link>
      </div>
    </form>
  );
}
