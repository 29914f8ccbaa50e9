import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { ConstantView } from '#shared/contracts/materials.ts';
import { asSentence, counted } from '#shared/wording/number-words.ts';
import { ErrorState } from '#src/ui/error-state.tsx';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { StateGlyph } from '#src/ui/glyphs/state-glyph.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { reachOf } from '../api.ts';

/** What turns stale if another record takes the place of this one, before it is done. */
export function Reach({ inForce }: { inForce: ConstantView }) {
  const reach = useQuery(reachOf(inForce.materialId, inForce.id));
  if (reach.isPending) return <LoadingState words="Counting what hangs on it…" />;
  if (reach.isError) return <ErrorState what="What hangs on it could not be counted." why={reach.error.message} />;
  const { estimates, boundValues, cases, closedCases, casesSeen } = reach.data;
  if (cases === 0)
    return <p className="text-ink-2">Nothing hangs on record {inForce.recordNumber} yet; nothing turns stale.</p>;
  return (
    <>
      <p className="mb-2 font-serif text-m">
        <b>
          {asSentence(counted(estimates, 'estimate'))} and {counted(boundValues, 'bound value')} in{' '}
          {counted(cases, 'case')} turn stale.
        </b>{' '}
        {closedCases > 0
          ? `${asSentence(counted(closedCases, 'of them is closed', 'of them are closed'))}: nothing in ${closedCases === 1 ? 'it' : 'them'} is touched; what is stale is told beside it.`
          : null}
      </p>
      <Table caption="Cases reached">
        <thead>
          <tr>
            <Th>Case</Th>
            <Th>State</Th>
            <Th numeric>Estimates</Th>
          </tr>
        </thead>
        <tbody>
          {casesSeen.map(({ number, state, estimates: count }) => (
            <tr key={number}>
              <td className="mono">
                <Link to={`/cases/${number}/estimates`}>{number}</Link>
              </td>
              <td>
                <GlyphWord glyph={<StateGlyph state={state} />}>{state}</GlyphWord>
              </td>
              <td className="num">{count}</td>
            </tr>
          ))}
        </tbody>
      </Table>
      {casesSeen.length < cases ? (
        <p className="mt-1 text-s text-ink-2">
          {asSentence(counted(cases - casesSeen.length, 'more is restricted', 'more are restricted'))} to named people.
        </p>
      ) : null}
    </>
  );
}
