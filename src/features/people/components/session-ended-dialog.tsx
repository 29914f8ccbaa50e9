import { useState } from 'react';
import type { Person } from '#shared/contracts/people.ts';
import { keepSession } from '#src/http/api.ts';
import { useSessionEnded } from '#src/http/session-ended.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { signIn } from '../api.ts';

/**
 * Stands over the page when a request found the session ended: the same person signs in again, and what waited goes on.
 * Someone else leaves for the sign-in and sees nothing of it.
 */
export function SessionEndedDialog({ person }: { person: Person }) {
  const { ended, goOn, giveUp } = useSessionEnded();
  const leave = () => {
    giveUp();
    window.location.assign('/sign-in');
  };
  return (
    <Dialog
      open={ended}
      onOpenChange={() => undefined}
      title="You have been signed out"
      description={
        <>
          Your session ended. <b>What you typed is kept</b> on this page and goes on when you have signed in again.
        </>
      }
    >
      <SignInAgain person={person} onDone={goOn} onLeave={leave} />
    </Dialog>
  );
}

function SignInAgain({ person, onDone, onLeave }: { person: Person; onDone: () => void; onLeave: () => void }) {
  const [password, setPassword] = useState('');
  const [error, setError] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const goOn = async () => {
    setBusy(true);
    try {
      keepSession(await signIn({ mail: person.mail, password }));
      onDone();
    } catch (failure) {
      setError(failure instanceof Error ? failure.message : 'The sign-in failed; try again.');
    } finally {
      setBusy(false);
    }
  };
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        void goOn();
      }}
    >
      <TextField
        type="password"
        label={`Password for ${person.name}`}
        autoComplete="current-password"
        value={password}
        error={error}
        onChange={(event) => setPassword(event.target.value)}
        className="mt-4"
        autoFocus
      />
      <div className="acts mt-4">
        <Button type="submit" kind="main" disabled={busy}>
          Sign in and go on
        </Button>
        <Button kind="plain" onClick={onLeave}>
          I am someone else
        </Button>
      </div>
      <p className="field-help">
        Someone else sees none of this; it waits for {person.name} as long as the page is open.
      </p>
    </form>
  );
}
