import { flawCover } from '../numeric/fracture/flaw-cover.ts';
import { OutsideDomain } from '../numeric/outside-domain.ts';
import type { RefusalCode } from '../numeric/refusal-codes.ts';

export type FlawPlaceEntered = {
  /** Which of the two was entered; the other is worked out, and both are shown. */
  readonly entered: 'depth of the centre' | 'cover';
  /** Below the tensile face, mm. */
  readonly belowFaceMm: number;
  /** Half of the flaw across the face, mm. */
  readonly halfAxisMm: number;
};

export type FlawPlace =
  | {
      /** `surface`: so close to the face that it counts as a surface flaw of the enclosing shape. */
      readonly kind: 'interior' | 'surface';
      readonly centreDepthMm: number;
      readonly coverMm: number;
    }
  | { readonly kind: 'refused'; readonly code: RefusalCode; readonly field: string };

/**
 * Where an interior flaw lies below the tensile face, from the depth of its centre or from its cover, and whether it counts
 * as interior. Refused where the flaw reaches through the face: then it is no interior flaw.
 */
export function placeFlaw({ entered, belowFaceMm, halfAxisMm }: FlawPlaceEntered): FlawPlace {
  const centreDepthMm = entered === 'cover' ? belowFaceMm + halfAxisMm : belowFaceMm;
  try {
    const { coverMm, treatedAs } = flawCover({ centreDepthMm, halfAxisMm });
    return { kind: treatedAs, centreDepthMm, coverMm: entered === 'cover' ? belowFaceMm : coverMm };
  } catch (refusal) {
    if (!(refusal instanceof OutsideDomain)) throw refusal;
    return {
      kind: 'refused',
      code: refusal.code,
      field: refusal.field === 'centreDepthMm' ? 'belowFaceMm' : refusal.field,
    };
  }
}
