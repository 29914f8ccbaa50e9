import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { PasswordAsk } from '#shared/contracts/people.ts';
import { askForPassword } from '../features/people/api.ts';
import { Frontispiece } from '../features/people/components/frontispiece.tsx';
import { Button } from '../ui/button.tsx';
import { Note } from '../ui/note.tsx';
import { TextField } from '../ui/text-field.tsx';

/** Where someone asks for a link to set a new password; the answer is the same for every address. */
export function Component() {
  const { register, handleSubmit, setError, formState } = useForm<PasswordAsk>({ resolver: zodResolver(PasswordAsk) });
  const { errors, isSubmitting, isSubmitSuccessful } = formState;
  const submit = handleSubmit(async ({ mail }) => {
    try {
      await askForPassword(mail);
    } catch (failure) {
      setError('mail', { message: failure instanceof Error ? failure.message : 'It was not sent; try again.' });
    }
  });
  return (
    <Frontispiece>
      <h2 className="mb-4 text-h3">A new password</h2>
      {isSubmitSuccessful ? (
        <Note tone="celadon" lead="Look into your mailbox." className="mb-5">
          If an open account has this address, a link is on its way. It holds one hour and works once.
        </Note>
      ) : null}
      <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-5">
        <TextField
          label="Mail address"
          type="email"
          autoComplete="username"
          autoFocus
          error={errors.mail?.message}
          {...register('mail')}
        />
        <div className="acts">
          <Button type="submit" kind="main" disabled={isSubmitting}>
            Send the link
          </Button>
          <Link to="/sign-in">Back to the sign-in</Link>
        </div>
      </form>
    </Frontispiece>
  );
}
