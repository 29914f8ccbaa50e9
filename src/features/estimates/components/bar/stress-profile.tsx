import { formatLength } from '#shared/wording/quantity.ts';
import type { BarFacts } from './bar-facts.ts';

const topPx = 30;
const heightPx = 138;

/** Stress through the depth where the origin lies: pressed at the top, pulled at the face below, nothing at the middle. */
export function StressProfile({ bar, width }: { bar: BarFacts; width: number }) {
  const middle = width / 2 + 6;
  const reach = width / 2 - 26;
  const bottom = topPx + heightPx;
  const yOf = (depthMm: number) => bottom - (depthMm / bar.depthMm) * heightPx;
  // The face at the origin's place along the bar; less than the whole where the origin lies outside the inner rollers.
  const faceHere = bar.origin.value / (1 - (2 * bar.yMm) / bar.depthMm);
  const originX = middle + (bar.origin.value / faceHere) * reach;
  const height = bottom + 26;
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block" fill="none" aria-hidden>
      <path d={`M${middle} ${topPx - 6}V${bottom + 6}`} stroke="var(--control)" />
      <path d={`M6 ${bottom}H${width - 6}M6 ${topPx}H${width - 6}`} stroke="var(--rule)" />
      <path
        d={`M${middle} ${topPx + heightPx / 2}L${middle + reach} ${bottom}H${middle}Z`}
        fill="var(--celadon-wash)"
        stroke="var(--celadon)"
        strokeWidth="1.4"
      />
      <path
        d={`M${middle} ${topPx + heightPx / 2}L${middle - reach} ${topPx}H${middle}Z`}
        stroke="var(--celadon)"
        strokeWidth="1.4"
        strokeDasharray="4 3"
      />
      <path d={`M${middle} ${yOf(bar.yMm)}H${originX}`} stroke="var(--o-mach)" strokeWidth="2" />
      <circle cx={originX} cy={yOf(bar.yMm)} r="4" fill="var(--o-mach)" />
      <g fontSize="13" fontWeight="600" fill="var(--o-mach)" textAnchor="end">
        <text x={middle - 7} y={yOf(bar.yMm) - 24}>
          {stressWords(bar.origin)}
        </text>
        <text x={middle - 7} y={yOf(bar.yMm) - 8}>
          {bar.yMm === 0 ? 'origin, at the face' : `origin, ${formatLength(bar.yMm)} up`}
        </text>
      </g>
      <g fontSize="12.5" fill="var(--ink-2)">
        <text x={middle + 6} y={topPx - 9}>
          pressed
        </text>
        <text x={width - 6} y={bottom + 18} textAnchor="end">
          {bar.yMm === 0 ? 'pulled, MPa' : `${stressWords(bar.face)} at the face`}
        </text>
      </g>
    </svg>
  );
}

function stressWords({ value, expanded }: BarFacts['face']): string {
  const decimals = expanded < 10 ? 1 : 0;
  return `${value.toFixed(decimals)} ± ${expanded.toFixed(decimals)}`;
}
