import { requireFinite, requireThat } from '../require.ts';
import type { DiscStress } from './disc-stress.ts';
import { plateStressUnitMPa, ringOnRingStressMPa, type RingOnRingDisc } from './ring-on-ring-stress.ts';

/**
 * Stresses at an origin on the tensile face of a ring-on-ring disc, MPa. Method `disc.ringOnRing.local`.
 *
 * Holds as `disc.ringOnRing`, out to the support ring; within about one thickness of the load ring the contact adds a
 * stress that is left out. Exact within thin-plate theory; rounding only.
 * Source: thin-plate solution, with q = r/(DL/2) ≥ 1 outside the load ring:
 * sigma_r = sigma − 3F/(2πh²) [(1+ν) ln q + ½(1−ν)(1−q⁻²)], sigma_θ with − before the second term.
 * @throws OutsideDomain, the first that applies: as `disc.ringOnRing`, then outside-validity-range for the radius
 * @example ringOnRingLocalStress({ loadN: 1000, thicknessMm: 2, poissonRatio: 0.22, supportDiameterMm: 30, loadDiameterMm: 10, discDiameterMm: 36, radiusMm: 9 }).radialStressMPa // 70.94…
 */
export function ringOnRingLocalStress(disc: RingOnRingDisc & { readonly radiusMm: number }): DiscStress {
  requireFinite({ ...disc });
  const centreStressMPa = ringOnRingStressMPa(disc);
  const { radiusMm, loadDiameterMm, supportDiameterMm, poissonRatio } = disc;
  requireThat(radiusMm >= 0 && radiusMm <= supportDiameterMm / 2, 'outside-validity-range', 'radiusMm');
  const ratio = Math.max(1, (2 * radiusMm) / loadDiameterMm);
  const bothMPa = plateStressUnitMPa(disc) * (1 + poissonRatio) * Math.log(ratio);
  const apartMPa = (plateStressUnitMPa(disc) * (1 - poissonRatio) * (1 - ratio ** -2)) / 2;
  return {
    radialStressMPa: centreStressMPa - bothMPa - apartMPa,
    tangentialStressMPa: centreStressMPa - bothMPa + apartMPa,
  };
}
