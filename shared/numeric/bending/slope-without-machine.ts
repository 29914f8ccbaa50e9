import { requireNotNegative, requirePositive, requireThat } from '../require.ts';

export type SlopedBar = {
  /** Load over deflection as measured, N/mm, > 0. */
  readonly slopeNPerMm: number;
  /** Of machine and fixture, mm/N, ≥ 0; 0 where the deflection was read on the bar. */
  readonly machineMmPerN: number;
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
};

export type ModulusFromSlope = {
  /** Of the bar alone, N/mm. */
  readonly specimenSlopeNPerMm: number;
  readonly modulusGPa: number;
};

/**
 * Load over deflection of the bar alone, N/mm, once the compliance of machine and fixture is taken off.
 * Source: compliances in a row add up, 1/k = 1/k_measured − C_machine.
 * @throws OutsideDomain outside-validity-range
 * @example slopeWithoutMachine({ slopeNPerMm: 2000, machineMmPerN: 1e-4, widthMm: 4, depthMm: 3 }) // 2500
 */
export function slopeWithoutMachine({ slopeNPerMm, machineMmPerN }: SlopedBar): number {
  requirePositive({ slopeNPerMm }, 'outside-validity-range');
  requireNotNegative({ machineMmPerN }, 'outside-validity-range');
  const specimenMmPerN = 1 / slopeNPerMm - machineMmPerN;
  // A machine softer than all that was measured: one of the two numbers is wrong.
  requireThat(specimenMmPerN > 0, 'outside-validity-range', 'machineMmPerN');
  return machineMmPerN === 0 ? slopeNPerMm : 1 / specimenMmPerN;
}
