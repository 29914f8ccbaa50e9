import { requireFinite, requirePositive, requireThat } from '../require.ts';

export type OutsideContact = {
  /** At the edge of the contact, MPa, > 0. */
  readonly edgeTensileStressMPa: number;
  /** Radius of the contact, mm, > 0. */
  readonly contactRadiusMm: number;
  /** From the middle of the contact, mm, at least the contact radius. */
  readonly distanceMm: number;
};

/**
 * Radial stress on the surface outside a contact, MPa, > 0. Method `hertz.sphere.radialDecay`.
 *
 * Holds as `hertz.sphere`, on the surface only. Rounding only. Source: sigma_r = sigma (a/r)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-stress,
 * outside-validity-range (inside the contact)
 * @example contactStressOutsideMPa({ edgeTensileStressMPa: 300, contactRadiusMm: 0.1, distanceMm: 0.16 }) // 117.1875
 */
export function contactStressOutsideMPa(place: OutsideContact): number {
  const { edgeTensileStressMPa, contactRadiusMm, distanceMm } = place;
  requireFinite({ edgeTensileStressMPa, contactRadiusMm, distanceMm });
  requirePositive({ contactRadiusMm }, 'non-positive-dimension');
  requirePositive({ edgeTensileStressMPa }, 'non-positive-stress');
  requireThat(distanceMm >= contactRadiusMm, 'outside-validity-range', 'distanceMm');
  return edgeTensileStressMPa * (contactRadiusMm / distanceMm) ** 2;
}
