import { requireFinite, requirePositive } from '../require.ts';
import { mmFromRootMetres } from '../units/root-metres.ts';

export type StressedFlaw = {
  /** Fracture toughness, MPa√m, > 0. */
  readonly toughnessMPaRootM: number;
  /** Shape factor with √π inside, dimensionless, > 0. */
  readonly shapeFactor: number;
  /** Total tensile stress at the origin, MPa, > 0. */
  readonly stressMPa: number;
};

/**
 * Size of the flaw that became unstable at a stress, mm, > 0: depth, minor half-axis or radius, never the full width.
 * Method `flaw.size`.
 *
 * Holds for a sharp flaw that is large against the grains, in linear elastic material. Rounding only.
 * Source: K = Y sigma √c at K = K_Ic, so c = (K_Ic / (Y sigma))².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, non-positive-toughness,
 * non-positive-shape-factor
 * @example flawSizeMm({ toughnessMPaRootM: 4.57, shapeFactor: 1.29, stressMPa: 700 }) // 0.02561…
 */
export function flawSizeMm(flaw: StressedFlaw): number {
  const { toughnessMPaRootM, shapeFactor, stressMPa } = flaw;
  requireFinite({ toughnessMPaRootM, shapeFactor, stressMPa });
  requirePositive({ stressMPa }, 'non-positive-stress');
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  requirePositive({ shapeFactor }, 'non-positive-shape-factor');
  return mmFromRootMetres(toughnessMPaRootM / (shapeFactor * stressMPa));
}
