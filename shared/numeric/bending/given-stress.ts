import { requireFinite, requirePositive, requireThat } from '../require.ts';

export type GivenStress = {
  /** Tensile stress at the origin, MPa, > 0. */
  readonly stressMPa: number;
  /** Standard uncertainty of it, MPa, > 0; absent where the analysis states none. */
  readonly standardUncertaintyMPa: number | undefined;
};

/**
 * A stress at the origin found by analysis elsewhere, MPa: passed on as it is, provided that it comes with an uncertainty.
 * Method `load.given`.
 *
 * Source: identity.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-stress, missing-uncertainty
 * @example givenStressMPa({ stressMPa: 2400, standardUncertaintyMPa: 168 }) // 2400
 */
export function givenStressMPa({ stressMPa, standardUncertaintyMPa }: GivenStress): number {
  requireFinite({ stressMPa });
  requirePositive({ stressMPa }, 'non-positive-stress');
  const isStated = standardUncertaintyMPa !== undefined && standardUncertaintyMPa > 0;
  requireThat(isStated, 'missing-uncertainty', 'stressMPa');
  return stressMPa;
}
