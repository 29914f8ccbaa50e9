import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';
import { requirePoissonRatio } from './require-poisson-ratio.ts';

export type SupportedPlate = {
  /** Pressure on the whole face within the support, MPa, ≥ 0. */
  readonly pressureMPa: number;
  /** Of the supporting circle, mm, > 0. */
  readonly radiusMm: number;
  /** Of the plate, mm, > 0. */
  readonly thicknessMm: number;
  /** Dimensionless, ≥ 0, < 0.5. */
  readonly poissonRatio: number;
};

/**
 * Stress at the centre of the tensile face of a round plate under pressure, its edge free to turn, MPa, ≥ 0; the same in
 * all directions of the face. Method `plate.supported.pressure`.
 *
 * Holds for a thin elastic plate with small deflection, not clamped; exact within that theory, rounding only.
 * Source: sigma = 3 (3 + ν) p (r/t)² / 8.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, poisson-out-of-range, negative-load
 * @example supportedPlateStressMPa({ pressureMPa: 0.1, radiusMm: 50, thicknessMm: 4, poissonRatio: 0.23 }) // 18.92…
 */
export function supportedPlateStressMPa(plate: SupportedPlate): number {
  const { pressureMPa, radiusMm, thicknessMm, poissonRatio } = plate;
  requireFinite({ pressureMPa, radiusMm, thicknessMm, poissonRatio });
  requirePositive({ radiusMm, thicknessMm }, 'non-positive-dimension');
  requirePoissonRatio({ poissonRatio });
  requireNotNegative({ pressureMPa }, 'negative-load');
  return (3 * (3 + poissonRatio) * pressureMPa * (radiusMm / thicknessMm) ** 2) / 8;
}
