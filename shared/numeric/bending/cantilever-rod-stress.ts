import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';

export type CantileverRod = {
  /** Load across the rod, N, ≥ 0. */
  readonly loadN: number;
  /** From the load to the fixed end, mm, > 0. */
  readonly armMm: number;
  /** Of the round section at the fixed end, mm, > 0. */
  readonly diameterMm: number;
};

/**
 * Tensile stress on the outer fibre at the fixed end of a rod loaded across, MPa, ≥ 0. Method `cantilever.rod`.
 *
 * Holds for a straight, elastic rod of round section; shear and the concentration of stress at the clamp are left out.
 * Exact within beam theory; rounding only.
 * Source: sigma = M c / I with M = F h, c = D / 2, I = π D⁴ / 64.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, negative-load
 * @example cantileverRodStressMPa({ loadN: 25, armMm: 60, diameterMm: 6 }) // 70.73…
 */
export function cantileverRodStressMPa(rod: CantileverRod): number {
  const { loadN, armMm, diameterMm } = rod;
  requireFinite({ loadN, armMm, diameterMm });
  requirePositive({ armMm, diameterMm }, 'non-positive-dimension');
  requireNotNegative({ loadN }, 'negative-load');
  return (32 * loadN * armMm) / (Math.PI * diameterMm ** 3);
}
