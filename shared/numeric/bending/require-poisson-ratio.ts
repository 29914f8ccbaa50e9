import { requireThat } from '../require.ts';

/** Refuses a Poisson's ratio below 0, or of 0.5 and more, as `poisson-out-of-range`. */
export function requirePoissonRatio({ poissonRatio }: { readonly poissonRatio: number }): void {
  requireThat(poissonRatio >= 0 && poissonRatio < 0.5, 'poisson-out-of-range', 'poissonRatio');
}
