import { useId, useState } from 'react';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { useEstimateActs } from '../api.ts';

/** Sets a line aside with a reason, or takes it up again. It stays shown either way. */
export function StandingActs({ estimate, caseNumber }: { estimate: EstimateView; caseNumber: string }) {
  const { stand } = useEstimateActs(caseNumber);
  const [reason, setReason] = useState<string | null>(null);
  const errorId = useId();
  const isAside = estimate.standing.standing === 'set aside';
  const words = `${isAside ? 'Take up' : 'Set aside'} estimate ${estimate.number}`;
  if (reason === null) {
    return (
      <button type="button" className="button is-plain is-small" onClick={() => setReason('')}>
        {words}
      </button>
    );
  }
  return (
    <form
      className="grid max-w-[420px] gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        const standing = isAside ? 'in use' : 'set aside';
        stand.mutate({ id: estimate.id, standing, reason }, { onSuccess: () => setReason(null) });
      }}
    >
      <TextField
        label={isAside ? 'Why it is taken up again' : 'Why it is set aside'}
        help="It stands beside the line here and in the report."
        value={reason}
        onChange={(event) => setReason(event.target.value)}
      />
      {stand.error ? (
        <FieldError id={errorId}>
          {stand.error instanceof Refusal ? stand.error.body.message : 'The server did not answer.'}
        </FieldError>
      ) : null}
      <div className="acts">
        <Button small type="submit" disabled={stand.isPending}>
          {words}
        </Button>
        <button type="button" className="button is-plain is-small" onClick={() => setReason(null)}>
          Leave it as it is
        </button>
      </div>
    </form>
  );
}
