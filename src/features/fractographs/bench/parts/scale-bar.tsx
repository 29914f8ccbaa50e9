import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { scaleBarOf } from '../ruler-ticks.ts';
import type { View } from '../view.ts';

const mostScreenPx = 140;

/** The bar at the lower left of a face: a round length, or px and the word uncalibrated. */
export function ScaleBar({ view, scale }: { view: View; scale: ReadingScale | null }) {
  const { widthScreenPx: width, words } = scaleBarOf(view, scale, mostScreenPx);
  const path = `M4 4V12M4 8H${width + 4}M${width + 4} 4V12`;
  return (
    <span className="flex w-fit items-center gap-1 rounded-[2px] bg-plate/80 text-s text-on-plate">
      <svg width={width + 8} height="16" aria-hidden>
        <path d={path} stroke="var(--m-halo)" strokeWidth="4.6" opacity="0.72" fill="none" />
        <path d={path} stroke="#fff" strokeWidth="1.8" fill="none" />
      </svg>
      <span className="px-1">{words}</span>
    </span>
  );
}
