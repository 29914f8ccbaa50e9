import { requireFinite, requireThat } from '../require.ts';

const mpaPerGpa = 1000;

export type QuenchedPlate = {
  /** Modulus, GPa, > 0. */
  readonly modulusGPa: number;
  /** Thermal expansion, 1/K. */
  readonly expansionPerK: number;
  /** By how much the surface is colder than the body, K; below 0 when it is hotter. */
  readonly temperatureDropK: number;
  /** Poisson's ratio, dimensionless, 0 to below 0.5. */
  readonly poissonRatio: number;
};

/**
 * Stress in the face of a plate cooled at once, MPa, tension positive; negative when the face is heated. Method
 * `thermal.plateInstant`.
 *
 * The upper bound: no heat has flowed yet, and the body holds the face in both directions. Rounding only.
 * Source: sigma = E α ΔT / (1 − ν).
 * @throws OutsideDomain, the first that applies: non-finite-input, outside-validity-range (E ≤ 0), poisson-out-of-range
 * @example plateInstantStressMPa({ modulusGPa: 70, expansionPerK: 9e-6, temperatureDropK: 60, poissonRatio: 0.22 }) // 48.46…
 */
export function plateInstantStressMPa(plate: QuenchedPlate): number {
  const { modulusGPa, expansionPerK, temperatureDropK, poissonRatio } = plate;
  requireFinite({ modulusGPa, expansionPerK, temperatureDropK, poissonRatio });
  requireThat(modulusGPa > 0, 'outside-validity-range', 'modulusGPa');
  requireThat(poissonRatio >= 0 && poissonRatio < 0.5, 'poisson-out-of-range', 'poissonRatio');
  return (modulusGPa * mpaPerGpa * expansionPerK * temperatureDropK) / (1 - poissonRatio);
}
