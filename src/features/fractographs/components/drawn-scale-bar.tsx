import type { ScaleView } from '#shared/contracts/fractographs.ts';
import { formatNumber } from '#shared/wording/quantity.ts';

const longestPx = 120;
const umPerMm = 1000;
const niceSteps = [1, 2, 5];

type DrawnScaleBarProps = { pxPerScreen: number; scale: ScaleView | null; x: number; y: number };

/** The bar at the lower left of a figure: a round length with its unit, or the word uncalibrated. */
export function DrawnScaleBar({ pxPerScreen, scale, x, y }: DrawnScaleBarProps) {
  const umPerScreen = scale ? scale.pixelSizeXUm * pxPerScreen : null;
  const lengthUm = umPerScreen === null ? 0 : roundLengthUm(longestPx * umPerScreen);
  const widthPx = umPerScreen === null ? 0 : lengthUm / umPerScreen;
  const bar = `M0-5V5M0 0H${widthPx}M${widthPx}-5V5`;
  const words =
    lengthUm >= umPerMm ? `${formatNumber(lengthUm / umPerMm)}\u00a0mm` : `${formatNumber(lengthUm)}\u00a0µm`;
  return (
    <g transform={`translate(${x} ${y})`} fill="none">
      {scale ? (
        <>
          <path d={bar} stroke="var(--m-halo)" strokeWidth="4.5" opacity="0.8" />
          <path d={bar} stroke="#fff" strokeWidth="1.8" />
        </>
      ) : null}
      <text
        x={widthPx + (scale ? 10 : 0)}
        y="4.5"
        fontSize="13"
        fontWeight="600"
        fill="#fff"
        stroke="var(--m-halo)"
        strokeWidth="3.2"
        strokeOpacity="0.8"
        strokeLinejoin="round"
        paintOrder="stroke"
      >
        {scale ? words : 'uncalibrated'}
      </text>
    </g>
  );
}

/** The largest of 1, 2, 5 times a power of ten that is not above the length. */
function roundLengthUm(mostUm: number): number {
  const power = 10 ** Math.floor(Math.log10(mostUm));
  return (niceSteps.filter((step) => step * power <= mostUm).at(-1) ?? 1) * power;
}
