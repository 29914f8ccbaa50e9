import type { OurUnit } from '../units/our-units.ts';
import { estimated, type Estimated } from './estimated.ts';

/** One input's part in an uncertainty. */
export type UncertainTerm = {
  /** Name of the input, as in the table of methods. */
  readonly input: string;
  /** Change of the value per unit of the input, signed. */
  readonly sensitivity: number;
  /** Standard uncertainty of the input, in the input's unit, ≥ 0. */
  readonly standardUncertainty: number;
};

export type BudgetRow = UncertainTerm & {
  /** |sensitivity| × standard uncertainty, in the unit of the value. */
  readonly contribution: number;
  /** Part of the variance, dimensionless, 0 to 1; 0 everywhere when nothing is uncertain. */
  readonly share: number;
};

/** Largest contribution first; equal ones in the order of the inputs. */
export type Budget = readonly BudgetRow[];

/**
 * First-order standard uncertainty of a value from independent inputs, with its budget.
 * Source: JCGM 100:2008, 5.1.2: u² = Σ (∂f/∂x_i)² u(x_i)².
 * @throws OutsideDomain non-finite-input, negative-uncertainty
 */
export function propagateUncertainty(of: {
  readonly value: number;
  readonly unit: OurUnit;
  readonly terms: readonly UncertainTerm[];
}): { readonly estimated: Estimated; readonly budget: Budget } {
  const contributions = of.terms.map((term) => Math.abs(term.sensitivity) * term.standardUncertainty);
  const variance = contributions.reduce((sum, contribution) => sum + contribution ** 2, 0);
  const budget = of.terms
    .map((term, index) => {
      const contribution = contributions[index] ?? Number.NaN;
      return { ...term, contribution, share: variance > 0 ? contribution ** 2 / variance : 0 };
    })
    .sort((one, other) => other.contribution - one.contribution);
  return { estimated: estimated(of.value, Math.sqrt(variance), of.unit), budget };
}
