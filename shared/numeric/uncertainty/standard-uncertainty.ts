import { requireFinite, requireNotNegative, requirePositive } from '../require.ts';

/** How a value is spread about its reading; kept with the input, used whole by a Monte Carlo run. */
export type Distribution = 'normal' | 'rectangular' | 'triangular';

/** How an uncertainty is stated. All figures in the unit of the value they belong to. */
export type StatedUncertainty =
  | { readonly kind: 'standard'; readonly standardUncertainty: number }
  /** A certificate's U with its k. */
  | { readonly kind: 'expanded'; readonly expandedUncertainty: number; readonly coverageFactor: number }
  /** Equally likely anywhere within ± half-width. */
  | { readonly kind: 'rectangular'; readonly halfWidth: number }
  /** Likeliest at the reading, falling in a line to nothing at ± half-width. */
  | { readonly kind: 'triangular'; readonly halfWidth: number };

/**
 * Standard uncertainty, same unit as stated, ≥ 0.
 * Source: JCGM 100:2008, 4.3: rectangular w/√3, triangular w/√6, certificate U/k.
 * @throws OutsideDomain, the first that applies: non-finite-input, negative-uncertainty, non-positive-dimension (k ≤ 0)
 * @example standardUncertaintyFrom({ kind: 'expanded', expandedUncertainty: 0.2, coverageFactor: 2 }) // 0.1
 */
export function standardUncertaintyFrom(stated: StatedUncertainty): number {
  switch (stated.kind) {
    case 'standard':
      return checked(stated.standardUncertainty);
    case 'expanded': {
      const { expandedUncertainty, coverageFactor } = stated;
      requireFinite({ expandedUncertainty, coverageFactor });
      requirePositive({ coverageFactor }, 'non-positive-dimension');
      return checked(expandedUncertainty / coverageFactor);
    }
    case 'rectangular':
      return checked(stated.halfWidth / Math.sqrt(3));
    case 'triangular':
      return checked(stated.halfWidth / Math.sqrt(6));
  }
}

function checked(standardUncertainty: number): number {
  requireFinite({ standardUncertainty });
  requireNotNegative({ standardUncertainty }, 'negative-uncertainty');
  return standardUncertainty;
}
