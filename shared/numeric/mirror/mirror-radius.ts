import { requireFinite, requirePositive } from '../require.ts';
import { mmFromRootMetres } from '../units/root-metres.ts';

export type MirrorOfStress = {
  /** Constant of the boundary whose radius is asked for, MPa√m, > 0. */
  readonly mirrorConstantMPaRootM: number;
  /** Total tensile stress at the origin, MPa, > 0. */
  readonly stressMPa: number;
};

/**
 * Radius at which the boundary is to be looked for under a stress, mm, > 0. Method `mirror.radius`; the inverse of
 * `mirror.stress`.
 *
 * Holds as `mirror.stress`. Rounding only.
 * Source: R = (A / sigma)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-constant, non-positive-stress
 * @example mirrorRadiusMm({ mirrorConstantMPaRootM: 2, stressMPa: 70 }) // 0.8163…
 */
export function mirrorRadiusMm(mirror: MirrorOfStress): number {
  const { mirrorConstantMPaRootM, stressMPa } = mirror;
  requireFinite({ mirrorConstantMPaRootM, stressMPa });
  requirePositive({ mirrorConstantMPaRootM }, 'non-positive-mirror-constant');
  requirePositive({ stressMPa }, 'non-positive-stress');
  return mmFromRootMetres(mirrorConstantMPaRootM / stressMPa);
}
