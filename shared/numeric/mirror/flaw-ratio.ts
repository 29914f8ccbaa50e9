import { requireFinite, requirePositive } from '../require.ts';

/**
 * Mirror radius over flaw size that a material should show, dimensionless, > 0. Method `mirror.flawRatio`. Needs no load.
 *
 * Source: A/√R = K_Ic/(Y√c), so R/c = (A Y/K_Ic)²; Y with √π inside.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-constant, non-positive-toughness,
 * non-positive-shape-factor
 * @example mirrorFlawRatio({ mirrorConstantMPaRootM: 1.88, toughnessMPaRootM: 0.8, shapeFactor: 1.29 }) // 9.189…
 */
export function mirrorFlawRatio(material: {
  readonly mirrorConstantMPaRootM: number;
  readonly toughnessMPaRootM: number;
  readonly shapeFactor: number;
}): number {
  const { mirrorConstantMPaRootM, toughnessMPaRootM, shapeFactor } = material;
  requireFinite({ mirrorConstantMPaRootM, toughnessMPaRootM, shapeFactor });
  requirePositive({ mirrorConstantMPaRootM }, 'non-positive-mirror-constant');
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  requirePositive({ shapeFactor }, 'non-positive-shape-factor');
  return ((mirrorConstantMPaRootM * shapeFactor) / toughnessMPaRootM) ** 2;
}
