import { Link } from 'react-router-dom';
import type { CalibrationReach } from '#shared/contracts/calibrations.ts';
import { Note } from '#src/ui/note.tsx';

/** What a change of a calibration would reach, before it is made. */
export function ReachWords({ code, reach }: { code: string; reach: CalibrationReach }) {
  const { bindings, lengths, estimates, boundValues, cases, otherCases } = reach;
  if (bindings === 0)
    return (
      <Note className="mt-3" lead={`Nothing hangs on ${code}.`}>
        No image is bound to it.
      </Note>
    );
  const closed = cases.filter(({ state }) => state === 'closed').length;
  const parts = [
    counted(bindings, 'image'),
    counted(lengths, 'length'),
    counted(estimates, 'estimate'),
    counted(boundValues, 'sentence'),
  ];
  return (
    <Note tone="ochre" className="mt-3" lead={`All that was read with ${code} turns stale:`}>
      {parts.filter(Boolean).join(', ')} in {counted(cases.length + otherCases, 'case')}
      {closed > 0
        ? `, ${closed} of them closed: nothing sealed is touched, and each gets an effect review`
        : null}.{' '}
      {cases.map(({ number, state }, index) => (
        <span key={number}>
          {index > 0 ? ', ' : null}
          <Link className="mono" to={`/cases/${number}`}>
            {number}
          </Link>{' '}
          {state}
        </span>
      ))}
      {otherCases > 0 ? `, and ${counted(otherCases, 'case')} not open to you` : null}
    </Note>
  );
}

function counted(count: number, word: string): string {
  if (count === 0) return '';
  return count === 1 ? `1 ${word}` : `${count} ${word}s`;
}
