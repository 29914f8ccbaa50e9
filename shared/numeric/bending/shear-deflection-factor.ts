import { requireFinite, requirePositive } from '../require.ts';
import { requirePoissonRatio } from './require-poisson-ratio.ts';

/**
 * Deflection of a three-point bar with shear over that without, dimensionless, ≥ 1. Method `modulus.shearFactor3`.
 *
 * `depthMm`, `outerSpanMm` > 0; `poissonRatio` 0 to below 0.5. For a rectangular section.
 * Source: Timoshenko beam with κ = 5/6: 1 + 2.4(1 + ν)(d/L)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, poisson-out-of-range,
 * non-positive-span
 * @example shearDeflectionFactor({ depthMm: 3, outerSpanMm: 40, poissonRatio: 0.23 }) // 1.016605
 */
export function shearDeflectionFactor(bar: {
  readonly depthMm: number;
  readonly outerSpanMm: number;
  readonly poissonRatio: number;
}): number {
  const { depthMm, outerSpanMm, poissonRatio } = bar;
  requireFinite({ depthMm, outerSpanMm, poissonRatio });
  requirePositive({ depthMm }, 'non-positive-dimension');
  requirePoissonRatio({ poissonRatio });
  requirePositive({ outerSpanMm }, 'non-positive-span');
  return 1 + 2.4 * (1 + poissonRatio) * (depthMm / outerSpanMm) ** 2;
}
