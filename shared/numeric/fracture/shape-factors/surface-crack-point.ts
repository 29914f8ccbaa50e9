import { requireFinite, requireThat } from '../../require.ts';
import { radiansFromDegrees, type FrontFactors } from './crack-front.ts';
import { surfaceCrackAt } from './surface-crack-at.ts';
import { surfaceCrackRatios, type SurfaceCrack } from './surface-crack.ts';

/**
 * F, H, Q and the shape factor at one point of the front of a surface crack, the parametric angle in degrees: 0 at the
 * surface, 90 at the deepest point. Holds and refuses as `surfaceCrackFront`, and refuses an angle beyond 0 to 90 as
 * outside-validity-range.
 */
export function surfaceCrackPoint(crack: SurfaceCrack & { readonly angleDegrees: number }): FrontFactors {
  const { angleDegrees, mode } = crack;
  const ratios = surfaceCrackRatios(crack);
  requireFinite({ angleDegrees });
  requireThat(angleDegrees >= 0 && angleDegrees <= 90, 'outside-validity-range', 'angleDegrees');
  return surfaceCrackAt(ratios, mode, radiansFromDegrees(angleDegrees));
}
