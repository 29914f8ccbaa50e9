import { requireFinite, requireThat } from '../require.ts';
import type { DiscStress } from './disc-stress.ts';
import { pistonOnThreeBallsStress, type PistonOnThreeBallsDisc } from './piston-on-three-balls-stress.ts';

/**
 * Stresses at an origin on the tensile face opposite the piston, MPa. Method `disc.pistonOnThreeBalls.local`.
 *
 * An estimate away from the centre: the three balls are taken for a ring, the pressure under the piston for even. Holds out
 * to the edge of the piston.
 * Source: thin plate under even pressure: sigma_r = sigma − 3F(3+ν)r²/(8π r2² h²), sigma_θ with (1+3ν).
 * @throws OutsideDomain, the first that applies: as `disc.pistonOnThreeBalls`, then outside-validity-range for the radius
 * @example pistonOnThreeBallsLocalStress({ loadN: 500, thicknessMm: 1.2, poissonRatio: 0.25, supportRadiusMm: 5, pistonRadiusMm: 0.7, discRadiusMm: 7, radiusMm: 0.35 }).radialStressMPa // 508.71…
 */
export function pistonOnThreeBallsLocalStress(
  disc: PistonOnThreeBallsDisc & { readonly radiusMm: number },
): DiscStress {
  requireFinite({ ...disc });
  const { stressMPa } = pistonOnThreeBallsStress(disc);
  const { loadN, thicknessMm, poissonRatio, pistonRadiusMm, radiusMm } = disc;
  requireThat(radiusMm >= 0 && radiusMm <= pistonRadiusMm, 'outside-validity-range', 'radiusMm');
  const unitMPa = (3 * loadN * radiusMm ** 2) / (8 * Math.PI * pistonRadiusMm ** 2 * thicknessMm ** 2);
  return {
    radialStressMPa: stressMPa - unitMPa * (3 + poissonRatio),
    tangentialStressMPa: stressMPa - unitMPa * (1 + 3 * poissonRatio),
  };
}
