import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { originOf, type BenchState, type ShownMark } from '../bench-state.ts';
import { nameOf } from '../readout.ts';
import { rulerTicks } from '../ruler-ticks.ts';

type RulerProps = { state: BenchState; marks: readonly ShownMark[]; scale: ReadingScale | null };

/** The ruler along the foot of a face: zero at the origin mark, in µm or mm; in px and "uncalibrated" without a scale. */
export function Ruler({ state, marks, scale }: RulerProps) {
  const origin = originOf(marks);
  const at = origin?.geometry.shape === 'point' ? origin.geometry.at.x : state.image.widthPx / 2;
  const zeroWords = `${origin ? `, ${nameOf(origin)}` : ''}${scale ? '' : ', uncalibrated'}`;
  const ticks = rulerTicks({ view: state.view, stage: state.stage, scale }, { xPx: at, name: zeroWords });
  const width = state.stage.widthScreenPx;
  return (
    <svg
      className="block border-t border-rule bg-plate"
      width={width}
      height="28"
      viewBox={`0 0 ${width} 28`}
      aria-hidden
    >
      {ticks.map(({ xScreenPx, label, isZero }) => (
        <g key={xScreenPx} transform={`translate(${xScreenPx} 0)`}>
          <path d={label === null ? 'M0 0V5' : 'M0 0V11'} stroke={label === null ? '#929b99' : 'var(--on-plate)'} />
          {label === null ? null : (
            <text y="23" fontSize="12.5" textAnchor="middle" fill={isZero ? 'var(--on-plate)' : 'var(--on-plate-2)'}>
              {label}
            </text>
          )}
        </g>
      ))}
    </svg>
  );
}
