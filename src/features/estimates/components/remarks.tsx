import type { EstimateView } from '#shared/contracts/estimates.ts';
import { findPracticeShapeFactor } from '#shared/rules/shape-factors.ts';
import { SetText } from './set-text.tsx';

/** What to know beside the number: cautions of the method with its source, and what was said by who made it. */
export function Remarks({ estimate }: { estimate: EstimateView }) {
  const { cautions, method, remark, standing, kept } = estimate;
  const shapeFactor = estimate.inputs.find((input) => input.name === 'Y');
  const practice = shapeFactor && findPracticeShapeFactor(shapeFactor.value);
  return (
    <ul className="grid gap-[6px] text-s [&>li]:border-b [&>li]:border-hairline [&>li]:pb-[6px]">
      <FaceOrOrigin estimate={estimate} />
      {cautions.map((caution) => (
        <li key={caution.code}>
          {caution.weight === 'warning' ? <b>{caution.sentence}</b> : caution.sentence}
          {caution.note ? ` Went on because: ${caution.note}` : ''}
        </li>
      ))}
      {practice ? (
        <li>
          <var>Y</var> is the practice value for {practice.shape}, {practice.text}; the full equation for a small flaw
          gives {practice.fullEquation} ({practice.equation}).
        </li>
      ) : null}
      {kept.map((each) => (
        <li key={each.at + each.why}>
          Kept although {each.why}: {each.reason}
        </li>
      ))}
      {standing.reason === '' ? null : (
        <li>
          {standing.standing === 'set aside' ? 'Set aside' : 'Taken up again'} by {standing.by?.name}: {standing.reason}
        </li>
      )}
      {remark === '' ? null : <li>{remark}</li>}
      <li className="text-ink-2">
        {method.title}, version {method.version}. <SetText text={method.source} /> ({method.sourceTag}). <var>k</var> =
        2.
      </li>
    </ul>
  );
}

/** Which of two stresses to quote, where the origin lies below the face. */
function FaceOrOrigin({ estimate }: { estimate: EstimateView }) {
  const face = estimate.outputs.find((output) => output.name === 'outerFibreStress');
  if (!face || face.expandedUncertainty === null || face.value === estimate.origin.value) return null;
  return (
    <li>
      <b>
        Quote {estimate.origin.text}, the stress at the origin, not {Math.round(face.value)} ±{' '}
        {Math.round(face.expandedUncertainty)} MPa:
      </b>{' '}
      that is what the tensile face carried.
    </li>
  );
}
