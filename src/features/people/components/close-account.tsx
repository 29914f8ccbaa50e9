import { useState } from 'react';
import type { AccountView } from '#shared/contracts/people.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { usePeopleActs } from '../api.ts';

/** Closes an account in two steps, or opens a closed one again. */
export function CloseAccount({ account, onDone }: { account: AccountView; onDone: () => void }) {
  const { close, openAgain } = usePeopleActs();
  const [asking, setAsking] = useState(false);
  const error = close.error ?? openAgain.error;
  const isClosed = account.state === 'closed';
  return (
    <div className="mt-5 border-t border-rule pt-4">
      {isClosed ? (
        <Button disabled={openAgain.isPending} onClick={() => openAgain.mutate(account, { onSuccess: onDone })}>
          Open the account again
        </Button>
      ) : null}
      {!isClosed && !asking ? (
        <Button kind="iron" onClick={() => setAsking(true)}>
          Close the account
        </Button>
      ) : null}
      {!isClosed && asking ? (
        <>
          <p className="mb-2">
            {account.name} is signed out everywhere at once and cannot sign in. What was signed and written stays.
          </p>
          <div className="acts">
            <Button
              kind="iron-filled"
              disabled={close.isPending}
              onClick={() => close.mutate(account, { onSuccess: onDone })}
            >
              Close it now
            </Button>
            <Button onClick={() => setAsking(false)}>Leave it open</Button>
          </div>
        </>
      ) : null}
      {error ? <FieldError id="close-error">{error.message}</FieldError> : null}
    </div>
  );
}
