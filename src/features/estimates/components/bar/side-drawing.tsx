import { formatNumber } from '#shared/wording/quantity.ts';
import { momentNmm, type BarFacts } from './bar-facts.ts';

const edgePx = 26;
const barTopPx = 40;
const rollerPx = 5;
const momentHeightPx = 66;
const nmmPerNm = 1000;
// Width of a letter of 13 px semibold, about.
const letterPx = 6.6;

/** The bar from the side to scale, on its rollers, and the moment along it. Sizes are px of screen. */
export function SideDrawing({ bar, width }: { bar: BarFacts; width: number }) {
  const pxPerMm = (width - 2 * edgePx) / (bar.outerSpanMm * 1.125);
  const middle = width / 2;
  const at = (xMm: number) => middle + xMm * pxPerMm;
  const depthPx = bar.depthMm * pxPerMm;
  const barBottom = barTopPx + depthPx;
  const axis = barBottom + 58;
  const half = bar.outerSpanMm / 2;
  const inner = bar.innerSpanMm === null ? 0 : bar.innerSpanMm / 2;
  const loading = bar.innerSpanMm === null ? [0] : [-inner, inner];
  const height = axis + momentHeightPx + 28;
  const originY = barBottom - bar.yMm * pxPerMm;
  const atOrigin = momentNmm(bar, bar.xMm);
  const momentY = (nmm: number) => axis + (nmm / momentNmm(bar, 0)) * momentHeightPx;
  return (
    <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block" fill="none" aria-hidden>
      <rect
        x={at(-half * 1.11)}
        y={barTopPx}
        width={half * 2.22 * pxPerMm}
        height={depthPx}
        fill="var(--well)"
        stroke="var(--ink)"
        strokeWidth="1.2"
      />
      {loading.map((xMm) => (
        <Roller key={xMm} x={at(xMm)} y={barTopPx - rollerPx - 1} pointsDown />
      ))}
      {[-half, half].map((xMm) => (
        <Roller key={xMm} x={at(xMm)} y={barBottom + rollerPx + 1} />
      ))}
      <text
        x={middle}
        y={loading.length === 1 ? 10 : 20}
        dx={loading.length === 1 ? 12 : 0}
        fontSize="12.5"
        textAnchor={loading.length === 1 ? 'start' : 'middle'}
        fill="var(--ink-2)"
      >
        {loading.length === 1
          ? `${formatNumber(bar.loadN)} N`
          : `${formatNumber(2 * inner)} mm, ${formatNumber(bar.loadN)} N in two`}
      </text>
      <path
        d={`M${at(-half)} ${axis}L${at(-inner)} ${axis + momentHeightPx}H${at(inner)}L${at(half)} ${axis}Z`}
        fill="var(--celadon-wash)"
        stroke="var(--celadon)"
        strokeWidth="1.4"
      />
      <path d={`M${at(-half * 1.11)} ${axis}H${at(half * 1.11)}`} stroke="var(--control)" />
      <text x={at(-half * 1.11)} y={axis - 6} fontSize="12.5" fill="var(--ink-2)">
        moment
      </text>
      <text x={middle} y={axis + 28} fontSize="12.5" textAnchor="middle" fill="var(--ink)">
        {formatNumber(atOrigin / nmmPerNm, { significantFigures: 4 })} N m at the origin
        {Math.abs(bar.xMm) <= inner ? ', all of it' : ''}
      </text>
      <path
        d={`M${at(bar.xMm)} ${originY}V${axis}M${at(bar.xMm)} ${axis + 34}V${momentY(atOrigin)}`}
        stroke="var(--m-origin)"
        strokeWidth="1.4"
        strokeDasharray="2 3"
      />
      <circle cx={at(bar.xMm)} cy={momentY(atOrigin)} r="3.4" fill="var(--o-mach)" />
      <OriginPoint x={at(bar.xMm)} y={originY} />
      <OriginWords bar={bar} x={at(bar.xMm)} y={barBottom + 21} right={at(half) - 14} />
      <Span
        from={at(-half)}
        to={at(half)}
        y={height - 12}
        words={`${formatNumber(bar.outerSpanMm)} mm between outer rollers`}
      />
    </svg>
  );
}

function Roller({ x, y, pointsDown = false }: { x: number; y: number; pointsDown?: boolean }) {
  const tail = pointsDown
    ? `M${x} ${y - 24}V${y - 8}M${x - 4} ${y - 13}L${x} ${y - 7}L${x + 4} ${y - 13}`
    : `M${x} ${y + 22}V${y + 8}M${x - 4} ${y + 13}L${x} ${y + 7}L${x + 4} ${y + 13}`;
  return (
    <g stroke="var(--ink)" strokeWidth="1.4">
      <circle cx={x} cy={y} r={rollerPx} fill="var(--sheet)" />
      <path d={tail} />
    </g>
  );
}

/** The origin as it is marked: an open ring with three ticks. */
export function OriginPoint({ x, y }: { x: number; y: number }) {
  return (
    <g transform={`translate(${x} ${y})`} stroke="var(--o-mach)" strokeWidth="1.8">
      <circle r="5" fill="var(--sheet)" />
      <path d="M-10 0H-5M5 0H10M0-10V-5" />
    </g>
  );
}

type OriginWordsProps = { bar: BarFacts; x: number; y: number; right: number };

/** Beside the origin's line, on the side where the words do not run into the roller at `right`. */
function OriginWords({ bar, x, y, right }: OriginWordsProps) {
  const sign = bar.xMm > 0 ? '+' : '';
  const words = bar.xMm === 0 ? 'origin' : `origin, x = ${sign}${formatNumber(bar.xMm)} mm`;
  const fits = x + 12 + words.length * letterPx < right;
  return (
    <text
      x={fits ? x + 12 : x - 12}
      y={y}
      textAnchor={fits ? 'start' : 'end'}
      fontSize="13"
      fontWeight="600"
      fill="var(--o-mach)"
    >
      {words}
    </text>
  );
}

function Span({ from, to, y, words }: { from: number; to: number; y: number; words: string }) {
  const middle = (from + to) / 2;
  const halfWords = words.length * 3.2 + 8;
  const room = halfWords < (to - from) / 2;
  return (
    <>
      <path
        d={
          room
            ? `M${from} ${y}H${middle - halfWords}M${middle + halfWords} ${y}H${to}M${from} ${y - 4}v8M${to} ${y - 4}v8`
            : ''
        }
        stroke="var(--control)"
      />
      <text x={middle} y={y + 4} fontSize="12.5" textAnchor="middle" fill="var(--ink-2)">
        {words}
      </text>
    </>
  );
}
