import { requireThat } from '../require.ts';
import type { OriginInBar } from './local-stress.ts';

/**
 * Refuses an origin that is not in the bar between the outer rollers: first depth-outside-section, then
 * position-outside-span. Both ends of each range belong to the bar.
 */
export function requireOriginInBar(
  origin: OriginInBar & { readonly outerSpanMm: number; readonly depthMm: number },
): void {
  const { xMm, yMm, outerSpanMm, depthMm } = origin;
  requireThat(yMm >= 0 && yMm <= depthMm, 'depth-outside-section', 'yMm');
  requireThat(Math.abs(xMm) <= outerSpanMm / 2, 'position-outside-span', 'xMm');
}
