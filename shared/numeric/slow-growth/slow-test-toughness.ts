import { requireFinite, requirePositive, requireThat } from '../require.ts';

export type SlowTest = {
  /** Fracture toughness, MPa√m, > 0. */
  readonly toughnessMPaRootM: number;
  /** Fracture stress in the slow or wet test, MPa, > 0, at most the inert strength. */
  readonly stressMPa: number;
  /** Strength without slow growth, MPa, > 0. */
  readonly inertStrengthMPa: number;
};

/**
 * Toughness that the first flaw seems to have in a slow test, MPa√m, and how far the flaw grew. Method
 * `scg.apparentToughness`. Use the first flaw with this one, or the last flaw with KIc, never mixed.
 *
 * Holds for the power law or any other: only the two strengths count. Rounding only.
 * Source: K_app = K_Ic sigma/Si; last over first size (Si/sigma)².
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, non-positive-toughness,
 * outside-validity-range (a stress above the inert strength)
 * @example slowTestToughness({ toughnessMPaRootM: 0.75, stressMPa: 55, inertStrengthMPa: 90 }).apparentToughnessMPaRootM // 0.45833…
 */
export function slowTestToughness(test: SlowTest): {
  readonly apparentToughnessMPaRootM: number;
  readonly flawGrowthRatio: number;
} {
  const { toughnessMPaRootM, stressMPa, inertStrengthMPa } = test;
  requireFinite({ toughnessMPaRootM, stressMPa, inertStrengthMPa });
  requirePositive({ stressMPa, inertStrengthMPa }, 'non-positive-stress');
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  requireThat(stressMPa <= inertStrengthMPa, 'outside-validity-range', 'stressMPa');
  return {
    apparentToughnessMPaRootM: (toughnessMPaRootM * stressMPa) / inertStrengthMPa,
    flawGrowthRatio: (inertStrengthMPa / stressMPa) ** 2,
  };
}
