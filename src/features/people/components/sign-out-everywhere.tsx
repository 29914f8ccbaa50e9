import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { useOwnActs } from '../api.ts';

/** Ends every session of the person, this one too, and goes to the sign-in. */
export function SignOutEverywhere() {
  const { signOutEverywhere } = useOwnActs();
  return (
    <div className="mt-3">
      <p className="mb-3 text-ink-2">
        Signs you out on every machine, this one too. Do it when a machine was lost or left open.
      </p>
      <Button
        disabled={signOutEverywhere.isPending}
        onClick={() => signOutEverywhere.mutate(undefined, { onSuccess: () => window.location.assign('/sign-in') })}
      >
        Sign out everywhere
      </Button>
      {signOutEverywhere.isError ? (
        <FieldError id="sign-out-error">{signOutEverywhere.error.message}</FieldError>
      ) : null}
    </div>
  );
}
