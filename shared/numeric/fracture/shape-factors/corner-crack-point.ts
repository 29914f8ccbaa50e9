import { requireFinite, requireThat } from '../../require.ts';
import { cornerCrackAt } from './corner-crack-at.ts';
import { cornerCrackRatios, type CornerCrack } from './corner-crack.ts';
import { radiansFromDegrees, type FrontFactors } from './crack-front.ts';

/**
 * F, H, Q and the shape factor at one point of the front of a corner crack, the parametric angle in degrees: 0 on the face
 * along the width, 90 on the face along the depth. Holds and refuses as `cornerCrackFront`, and refuses an angle beyond
 * 0 to 90 as outside-validity-range.
 */
export function cornerCrackPoint(crack: CornerCrack & { readonly angleDegrees: number }): FrontFactors {
  const { angleDegrees, mode } = crack;
  const ratios = cornerCrackRatios(crack);
  requireFinite({ angleDegrees });
  requireThat(angleDegrees >= 0 && angleDegrees <= 90, 'outside-validity-range', 'angleDegrees');
  return cornerCrackAt(ratios, mode, radiansFromDegrees(angleDegrees));
}
