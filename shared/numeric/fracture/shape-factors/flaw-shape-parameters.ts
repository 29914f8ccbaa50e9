import { requireFinite, requireThat } from '../../require.ts';
import { ellipticE } from '../../special-functions/elliptic-e.ts';
import { flawShapeParameter } from './front-terms.ts';

/**
 * Flaw shape parameter Q of an ellipse, dimensionless, 1 to π²/4: Newman and Raju's approximation beside the exact E(k)².
 * Method `Y.embedded.Qapprox`. √Q differs by at most 0.07 %.
 *
 * Source: Q = 1 + 1.464 (a/c)^1.65; E the complete elliptic integral of the second kind, k² = 1 − (a/c)².
 * @throws OutsideDomain non-finite-input, outside-validity-range (a/c ≤ 0 or > 1)
 * @example flawShapeParameters({ minorOverMajor: 0.5 }) // { approximate: 1.46648…, exact: 1.46665… }
 */
export function flawShapeParameters({ minorOverMajor }: { readonly minorOverMajor: number }): {
  readonly approximate: number;
  readonly exact: number;
} {
  requireFinite({ minorOverMajor });
  requireThat(minorOverMajor > 0 && minorOverMajor <= 1, 'outside-validity-range', 'minorOverMajor');
  return { approximate: flawShapeParameter(minorOverMajor), exact: ellipticE(minorOverMajor) ** 2 };
}
