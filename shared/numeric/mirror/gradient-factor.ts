import { surfaceCrackAt } from '../fracture/shape-factors/surface-crack-at.ts';
import { requireFinite, requirePositive, requireThat } from '../require.ts';

export type GradientFactor = {
  /** Along the tensile face, 0 to 1. */
  readonly surface: number;
  /** At the deepest point of the mirror, 0 to 1. */
  readonly depth: number;
};

/**
 * What is left of the driving force at a mirror's boundary in bending against uniform stress, dimensionless, 0 to 1.
 * Method `mirror.gradientFactor`; the stress on the outer face is then A/(√R·G). `radiusOverDepth`: > 0 and < 1.
 *
 * An estimate: a half-round front at rest stands in for the running crack.
 * Source: G = F(R/d)·H(R/d)/F(0) of a half-round surface crack of radius R, Newman and Raju's equations for bending.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-radius, outside-validity-range
 * @example gradientFactor({ radiusOverDepth: 0.2 }) // { surface: 0.9285…, depth: 0.7363… }
 */
export function gradientFactor({ radiusOverDepth }: { readonly radiusOverDepth: number }): GradientFactor {
  requireFinite({ radiusOverDepth });
  requirePositive({ radiusOverDepth }, 'non-positive-mirror-radius');
  requireThat(radiusOverDepth < 1, 'outside-validity-range', 'radiusOverDepth');
  return { surface: against(radiusOverDepth, 0), depth: against(radiusOverDepth, Math.PI / 2) };
}

function against(radiusOverDepth: number, angleRad: number): number {
  return halfRound(radiusOverDepth, angleRad) / halfRound(0, angleRad);
}

function halfRound(depthOverThickness: number, angleRad: number): number {
  const ratios = { depthOverHalfLength: 1, depthOverThickness, halfLengthOverWidth: 0 };
  return surfaceCrackAt(ratios, 'bending', angleRad).shapeFactor;
}
