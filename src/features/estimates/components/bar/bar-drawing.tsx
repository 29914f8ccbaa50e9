import { useRef } from 'react';
import { formatLength, formatNumber } from '#shared/wording/quantity.ts';
import { FigureCaption } from '#src/ui/figure-caption.tsx';
import { useWidth } from '#src/ui/use-width.ts';
import type { BarFacts } from './bar-facts.ts';
import { SectionDrawing } from './section-drawing.tsx';
import { SideDrawing } from './side-drawing.tsx';
import { StressProfile } from './stress-profile.tsx';

const usualWidthPx = 620;
const sideBySideFromPx = 600;
const profileWidthPx = 216;
const gapPx = 24;

/** The bar drawn to scale with its moment, its section and the stress through its depth; the origin on each. */
export function BarDrawing({ bar }: { bar: BarFacts }) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame, usualWidthPx);
  const isWide = width >= sideBySideFromPx;
  const sideWidth = isWide ? width - profileWidthPx - gapPx : width;
  return (
    <figure className="my-3">
      <div
        ref={frame}
        role="img"
        aria-label={barSentence(bar)}
        className={isWide ? 'flex items-start justify-between' : ''}
      >
        <SideDrawing bar={bar} width={sideWidth} />
        <div className={isWide ? '' : 'mt-4 flex flex-wrap items-end gap-6'}>
          <StressProfile bar={bar} width={profileWidthPx} />
          <SectionDrawing bar={bar} />
        </div>
      </div>
      <FigureCaption>
        The bar to scale, its moment, its section, and the stress through its depth, with the origin on each.
      </FigureCaption>
    </figure>
  );
}

function barSentence(bar: BarFacts): string {
  const rollers = bar.innerSpanMm === null ? 'three rollers' : 'four rollers';
  const at = bar.xMm === 0 ? 'at mid-span' : `${formatNumber(Math.abs(bar.xMm))} mm from mid-span`;
  const stress = (of: BarFacts['face']) => `${Math.round(of.value)} ± ${Math.round(of.expanded)} MPa`;
  return `Side view of the bar on ${rollers}, ${formatNumber(bar.outerSpanMm)} mm between the outer ones, loaded with ${formatNumber(bar.loadN)} N. The origin lies ${at}, ${formatLength(bar.yMm)} below the tensile face, where the stress is ${stress(bar.origin)}; at the face it is ${stress(bar.face)}.`;
}
