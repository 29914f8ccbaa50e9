import { requireThat } from '../require.ts';
import { fitLine } from '../special-functions/fit-line.ts';
import { twoSidedP } from '../special-functions/student-t.ts';
import { mirrorPoints, type MirrorLot } from './mirror-lot.ts';

export type FittedWithIntercept = {
  readonly mirrorConstantMPaRootM: number;
  readonly uMirrorConstantMPaRootM: number;
  /** Applied stress at which the line meets 1/√R = 0; positive over a compressed surface. */
  readonly interceptMPa: number;
  readonly uInterceptMPa: number;
  /** −intercept, tension positive. */
  readonly residualStressMPa: number;
  /** Absent when the mirrors lie on the line exactly, and there is nothing to test against. */
  readonly test?: { readonly t: number; readonly p: number };
  readonly degreesOfFreedom: number;
};

/**
 * Mirror constant and residual stress of a lot by the line σ = A/√R + B on the applied stresses. Method
 * `mirror.fit.intercept`. n ≥ 3 mirrors; ten, over a fourfold range of R, are better.
 *
 * A diagnostic: an intercept that is not zero says residual stress, a shifted boundary criterion, or gradient.
 * Source: ordinary least squares; t = B/u(B) on n − 2 degrees of freedom, p two-sided.
 * @throws OutsideDomain, the first that applies: those of `mirrorPoints`, outside-validity-range (all radii alike)
 * @example fitWithIntercept({ radiiMm: [0.1, 0.2, 0.4], stressesMPa: [200, 141.42, 100] }).mirrorConstantMPaRootM // 2.000…
 */
export function fitWithIntercept(lot: MirrorLot): FittedWithIntercept {
  const points = mirrorPoints(lot, 3).map(({ perRootMetre, stressMPa }) => ({ x: perRootMetre, y: stressMPa }));
  const line = fitLine(points);
  requireThat(line !== undefined, 'outside-validity-range', 'radiiMm');
  const { slope, uSlope, intercept, uIntercept, degreesOfFreedom } = line;
  const t = intercept / uIntercept;
  return {
    mirrorConstantMPaRootM: slope,
    uMirrorConstantMPaRootM: uSlope,
    interceptMPa: intercept,
    uInterceptMPa: uIntercept,
    residualStressMPa: -intercept,
    ...(uIntercept > 0 && { test: { t, p: twoSidedP({ t, degreesOfFreedom }) } }),
    degreesOfFreedom,
  };
}
