import { requireThat } from '../require.ts';
import { fitLine } from '../special-functions/fit-line.ts';
import { studentTQuantile } from '../special-functions/student-t.ts';
import { mirrorPoints, type MirrorLot } from './mirror-lot.ts';

export type FittedExponent = {
  /** m in σ = A·R^m; −½ by the mirror relation. */
  readonly exponent: number;
  readonly uExponent: number;
  /** (m + ½)/u(m); absent when the mirrors lie on the line exactly. */
  readonly tAgainstMinusHalf?: number;
  /** What |t| must stay below at 95 %, on n − 2 degrees of freedom. */
  readonly t975: number;
};

/**
 * Exponent of the radius by the line ln σ = ln A + m ln R. Method `mirror.fit.loglog`. n ≥ 3 mirrors; ten, over a fourfold
 * range of R, are better.
 *
 * A diagnostic: an exponent that is not −½ says large mirrors, flaws that are not small, or residual stress.
 * Source: ordinary least squares.
 * @throws OutsideDomain, the first that applies: those of `mirrorPoints`, outside-validity-range (all radii alike)
 * @example fitExponent({ radiiMm: [0.1, 0.2, 0.4], stressesMPa: [200, 141.42, 100] }).exponent // −0.5000…
 */
export function fitExponent(lot: MirrorLot): FittedExponent {
  const points = mirrorPoints(lot, 3);
  const line = fitLine(points.map(({ radiusMm, stressMPa }) => ({ x: Math.log(radiusMm), y: Math.log(stressMPa) })));
  requireThat(line !== undefined, 'outside-validity-range', 'radiiMm');
  const { slope, uSlope, degreesOfFreedom } = line;
  return {
    exponent: slope,
    uExponent: uSlope,
    ...(uSlope > 0 && { tAgainstMinusHalf: (slope + 0.5) / uSlope }),
    t975: studentTQuantile({ probability: 0.975, degreesOfFreedom }),
  };
}
