import type { PointPx } from '#shared/contracts/marks.ts';
import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { formatLength, formatNumber } from '#shared/wording/quantity.ts';
import type { ShownMark } from './bench-state.ts';

export type ReadoutFrom = {
  readonly reticle: PointPx;
  readonly origin: ShownMark | null;
  readonly scale: ReadingScale | null;
  /** Grey of the pixel under the reticle, 0 to 255; null where its tile is not here. */
  readonly grey: number | null;
};

const noBreakSpace = '\u00a0';

/** What the reticle says: how far from the origin and in which direction, or where on the image; then the grey. */
export function readoutWords({ reticle, origin, scale, grey }: ReadoutFrom): string {
  const greyWords = grey === null ? '' : ` Grey ${Math.round(grey)}.`;
  const from = origin?.geometry.shape === 'point' ? origin.geometry.at : null;
  if (!origin || !from) {
    const at = `${formatNumber(Math.round(reticle.x))}, ${formatNumber(Math.round(reticle.y))}`;
    return `Reticle at ${at}${noBreakSpace}px, no origin marked.${greyWords}`;
  }
  const [x, y] = [reticle.x - from.x, from.y - reticle.y];
  const degrees = Math.round(((Math.atan2(y, x) * 180) / Math.PI + 360) % 360);
  return `Reticle ${awayWords({ x, y }, scale)} from ${nameOf(origin)}, at ${degrees}°.${greyWords}`;
}

function awayWords({ x, y }: PointPx, scale: ReadingScale | null): string {
  if (!scale) return `${formatNumber(Math.hypot(x, y), { decimals: 0 })}${noBreakSpace}px (uncalibrated)`;
  const mm = Math.hypot(x * scale.pixelSizeXUm, y * scale.pixelSizeYUm) / 1000;
  return formatLength(mm, mm < 1 ? { atMostFigures: 3 } : {});
}

/** m3, or "new mark" until the server has given it its number. */
export function nameOf(mark: Pick<ShownMark, 'number'>): string {
  return mark.number === null ? 'new mark' : `m${mark.number}`;
}
