import { requireFinite, requirePositive } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

export type CriticalFlaw = {
  /** Fracture toughness, MPa√m, > 0. */
  readonly toughnessMPaRootM: number;
  /** Shape factor with √π inside, dimensionless, > 0. */
  readonly shapeFactor: number;
  /** Depth, minor half-axis or radius, mm, > 0; never the full width. */
  readonly flawSizeMm: number;
};

/**
 * Total tensile stress at the flaw when it became unstable, MPa, > 0. Method `flaw.stress`.
 *
 * Holds for a sharp flaw that is large against the grains, in linear elastic material. Rounding only.
 * Source: K = Y sigma √c at K = K_Ic, so sigma = K_Ic / (Y √c).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-flaw-size, non-positive-toughness,
 * non-positive-shape-factor
 * @example flawStressMPa({ toughnessMPaRootM: 3.5, shapeFactor: 1.29, flawSizeMm: 0.06 }) // 350.26…
 */
export function flawStressMPa(flaw: CriticalFlaw): number {
  const { toughnessMPaRootM, shapeFactor, flawSizeMm } = flaw;
  requireFinite({ toughnessMPaRootM, shapeFactor, flawSizeMm });
  requirePositive({ flawSizeMm }, 'non-positive-flaw-size');
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  requirePositive({ shapeFactor }, 'non-positive-shape-factor');
  return toughnessMPaRootM / (shapeFactor * rootMetresFromMm(flawSizeMm));
}
