import { formatNumber } from '#shared/wording/quantity.ts';
import type { BarFacts } from './bar-facts.ts';
import { OriginPoint } from './side-drawing.tsx';

const widestPx = 84;
const edgePx = 12;

/** The section across the bar, its sides to one scale, the tensile face below; the origin stands at its depth. */
export function SectionDrawing({ bar }: { bar: BarFacts }) {
  const pxPerMm = widestPx / Math.max(bar.widthMm, bar.depthMm);
  const width = bar.widthMm * pxPerMm;
  const depth = bar.depthMm * pxPerMm;
  const height = depth + 34;
  return (
    <svg width="216" height={height} viewBox={`0 0 216 ${height}`} className="block" fill="none" aria-hidden>
      <rect x={edgePx} y="4" width={width} height={depth} fill="var(--well)" stroke="var(--ink)" strokeWidth="1.2" />
      <path d={`M${edgePx} ${4 + depth}h${width}`} stroke="var(--celadon)" strokeWidth="2.4" />
      <OriginPoint x={edgePx + width / 2} y={4 + depth - bar.yMm * pxPerMm} />
      <text x={edgePx + width + 8} y={4 + depth / 2 + 4} fontSize="12.5" fill="var(--ink-2)">
        d {formatNumber(bar.depthMm)} mm
      </text>
      <text x={edgePx} y={depth + 24} fontSize="12.5" fill="var(--ink-2)">
        b {formatNumber(bar.widthMm)} mm, face pulled below
      </text>
    </svg>
  );
}
