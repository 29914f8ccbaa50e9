import type { TrailCheck } from '#shared/contracts/laboratory.ts';
import { formatInstant } from '#shared/wording/dates.ts';
import { Button } from '#src/ui/button.tsx';
import { ErrorState } from '#src/ui/error-state.tsx';
import { Note } from '#src/ui/note.tsx';
import { useLaboratoryActs } from '../api.ts';

/** Recomputes the whole trail on request, and says whether it is what was written. */
export function TrailCheckLine() {
  const { checkTrail } = useLaboratoryActs();
  return (
    <div className="my-3">
      <div className="acts mb-3">
        <Button disabled={checkTrail.isPending} onClick={() => checkTrail.mutate()}>
          Check the chain
        </Button>
        <span className="text-s text-ink-2" role="status">
          {checkTrail.isPending
            ? 'Recomputing every entry…'
            : 'Each entry carries the hash of the one before it; the check recomputes them all.'}
        </span>
      </div>
      {checkTrail.isError ? <ErrorState what="The chain could not be checked." why={checkTrail.error.message} /> : null}
      {checkTrail.data ? <Found check={checkTrail.data} /> : null}
    </div>
  );
}

function Found({ check }: { check: TrailCheck }) {
  const extent = `${check.entries.toLocaleString('en-GB')} entries in ${check.chains} ${check.chains === 1 ? 'chain' : 'chains'}`;
  if (check.broken.length === 0)
    return (
      <Note tone="celadon" lead="The trail is what was written.">
        {extent} recomputed, and every hash matches.
      </Note>
    );
  return (
    <Note tone="iron" alert lead="The trail is not what was written.">
      {extent} recomputed. The first that does not match:
      <ul className="mt-1">
        {check.broken.map((broken) => (
          <li key={broken.entryId}>
            <span className="mono">{broken.caseNumber ?? 'laboratory'}</span>, entry{' '}
            <span className="mono">{broken.entryId}</span>, {broken.personName} {broken.words},{' '}
            {formatInstant(broken.at)}: <b>{broken.fault}</b>
          </li>
        ))}
      </ul>
    </Note>
  );
}
