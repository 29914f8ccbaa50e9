import { requireNotNegative, requireThat } from '../require.ts';

export type DeflectedBar = {
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
  /** Of the bar itself, without that of machine and fixture, mm, ≥ 0. */
  readonly deflectionMm: number;
};

// Deflection over span above which the formulas for small deflection are not used: trade practice.
export const mostDeflectionOverSpan = 0.1;

/** Refuses a deflection below 0, or above a tenth of the span, as `outside-validity-range`. */
export function requireSmallDeflection({ deflectionMm, spanMm }: { deflectionMm: number; spanMm: number }): void {
  requireNotNegative({ deflectionMm }, 'outside-validity-range');
  requireThat(deflectionMm <= mostDeflectionOverSpan * spanMm, 'outside-validity-range', 'deflectionMm');
}
