import { requireFinite, requireThat } from '../require.ts';
import { fourPointRodLocalStress } from './four-point-rod-local-stress.ts';
import type { FourPointRod } from './four-point-rod-stress.ts';
import type { LocalStress } from './local-stress.ts';

export type OriginRoundRod = {
  /** Along the rod from mid-span, signed, mm, at most half the outer span either way. */
  readonly xMm: number;
  /** Round the surface from the lowest fibre, either way, degrees, −180 to 180. */
  readonly angleDeg: number;
};

// The lowest fibre is at 0 and the highest at half a turn either way.
const halfTurnDeg = 180;
export const radiansPerDegree = Math.PI / halfTurnDeg;

/**
 * Axial stress at an origin on the surface of a four-point rod, MPa, with its height above the lowest fibre, mm.
 * Negative is compression and is given, not refused. Method `bend4.rod.local.angle`.
 *
 * Holds as `bend4.rod.local`. Rounding only.
 * Source: y = (D/2)(1 − cos θ), so that 1 − 2y/D = cos θ.
 * @throws OutsideDomain, the first that applies: as `bend4.rod.local`, then outside-validity-range for the angle
 * @example fourPointRodAngleStress({ loadN: 690, outerSpanMm: 40, innerSpanMm: 20, diameterMm: 4, xMm: 0, angleDeg: 25 }).yMm // 0.18738…
 */
export function fourPointRodAngleStress(rod: FourPointRod & OriginRoundRod): LocalStress & { readonly yMm: number } {
  const { angleDeg, ...withoutAngle } = rod;
  requireFinite({ ...rod });
  const cosine = Math.cos(angleDeg * radiansPerDegree);
  const yMm = (rod.diameterMm / 2) * (1 - cosine);
  // A wrong diameter is named before its consequence for y.
  const stress = fourPointRodLocalStress({ ...withoutAngle, yMm: Math.max(0, yMm) });
  requireThat(Math.abs(angleDeg) <= halfTurnDeg, 'outside-validity-range', 'angleDeg');
  return { ...stress, yMm };
}
