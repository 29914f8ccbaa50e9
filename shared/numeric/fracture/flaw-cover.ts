import { requireFinite, requirePositive, requireThat } from '../require.ts';

export type FlawBelowFace = {
  /** Centre of the flaw below the tensile face, mm. */
  readonly centreDepthMm: number;
  /** Half of the flaw across the face, mm, > 0. */
  readonly halfAxisMm: number;
};

export type FlawCover = {
  /** Nearest edge of the flaw below the face, mm, ≥ 0. */
  readonly coverMm: number;
  /** `surface` when the cover is less than half the half-axis: taken as a surface flaw of the enclosing shape. */
  readonly treatedAs: 'interior' | 'surface';
};

/**
 * What stands between an interior flaw and the tensile face, and whether it counts as interior at all.
 *
 * Source: cover = y − a; below a/2 the flaw is treated as a surface flaw of the enclosing shape (trade practice, on the safe
 * side).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, outside-validity-range (the flaw
 * reaches through the face, so it is no interior flaw)
 * @example flawCover({ centreDepthMm: 0.11, halfAxisMm: 0.045 }) // { coverMm: 0.065, treatedAs: 'interior' }
 */
export function flawCover({ centreDepthMm, halfAxisMm }: FlawBelowFace): FlawCover {
  requireFinite({ centreDepthMm, halfAxisMm });
  requirePositive({ halfAxisMm }, 'non-positive-flaw-size');
  const coverMm = centreDepthMm - halfAxisMm;
  requireThat(coverMm >= 0, 'outside-validity-range', 'centreDepthMm');
  return { coverMm, treatedAs: coverMm < halfAxisMm / 2 ? 'surface' : 'interior' };
}
