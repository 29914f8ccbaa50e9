import { useState } from 'react';
import { leastPasswordLength, passwordFault } from '#shared/rules/password-fault.ts';
import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';

type NewPasswordFormProps = {
  owner: { name: string; mail: string };
  verb: string;
  /** Keeps the password; what it throws is shown under the field. */
  onChosen: (password: string) => Promise<void>;
};

/** One field for a new password, checked by the same rule as on the server. */
export function NewPasswordForm({ owner, verb, onChosen }: NewPasswordFormProps) {
  const [password, setPassword] = useState('');
  const [isShown, setShown] = useState(false);
  const [error, setError] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const choose = async () => {
    const fault = passwordFault(password, owner);
    setError(fault);
    if (fault) return;
    setBusy(true);
    try {
      await onChosen(password);
    } catch (failure) {
      setError(failure instanceof Error ? failure.message : 'It was not kept; try again.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <form
      className="flex flex-col gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void choose();
      }}
    >
      <input type="hidden" name="username" autoComplete="username" value={owner.mail} readOnly />
      <TextField
        label="New password"
        type={isShown ? 'text' : 'password'}
        autoComplete="new-password"
        value={password}
        error={error}
        help={`At least ${leastPasswordLength} characters, without your name or mail address. A few words in a row do well.`}
        onChange={(event) => setPassword(event.target.value)}
        autoFocus
      />
      <CheckField label="Show what I type" checked={isShown} onChange={(event) => setShown(event.target.checked)} />
      <div className="acts">
        <Button type="submit" kind="main" disabled={busy}>
          {verb}
        </Button>
      </div>
    </form>
  );
}
