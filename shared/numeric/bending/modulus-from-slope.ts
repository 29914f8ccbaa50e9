import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';
import type { DeflectionPlace } from './strain-from-deflection.ts';

type Sloped = {
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

const mpaPerGpa = 1000;

/**
 * Elastic modulus of a three-point bar from the slope of load over mid-span deflection, GPa. Method `modulus.slope3`.
 *
 * Holds for small deflection of a slender elastic bar; shear is left out. Crosshead travel is no deflection unless the
 * compliance of the machine is taken off.
 * Source: beam theory, E = kL³/(4bd³), 1/k = 1/k_measured − C_machine.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * outside-validity-range for slope and compliance
 * @example threePointModulus({ slopeNPerMm: 2100, machineMmPerN: 0, outerSpanMm: 40, widthMm: 4, depthMm: 3 }).modulusGPa // 311.11…
 */
export function threePointModulus(bar: Sloped & { readonly outerSpanMm: number }): ModulusFromSlope {
  requireFinite({ ...bar });
  const { outerSpanMm, widthMm, depthMm } = bar;
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requirePositive({ outerSpanMm }, 'non-positive-span');
  const specimenSlopeNPerMm = slopeWithoutMachine(bar);
  const modulusMPa = (specimenSlopeNPerMm * outerSpanMm ** 3) / (4 * widthMm * depthMm ** 3);
  return { specimenSlopeNPerMm, modulusGPa: modulusMPa / mpaPerGpa };
}

/**
 * Elastic modulus of a four-point bar from the slope of load over a deflection, GPa. Methods `modulus.slope4.midspan` and
 * `modulus.slope4.loadpoint`.
 *
 * Holds as `modulus.slope3`, for equal arms.
 * Source: beam theory with a = (Lo − Li)/2: E = ka(3Lo² − 4a²)/(4bd³) at mid-span, ka²(3Lo − 4a)/(bd³) at the inner rollers.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, non-positive-span,
 * negative-inner-span, inner-span-not-less-than-outer, outside-validity-range for slope and compliance
 * @example fourPointModulus({ slopeNPerMm: 5200, machineMmPerN: 0, outerSpanMm: 40, innerSpanMm: 20, widthMm: 4, depthMm: 3 }, 'inner rollers').modulusGPa // 385.18…
 */
export function fourPointModulus(bar: Sloped & FourPointSpans, at: DeflectionPlace): ModulusFromSlope {
  requireFinite({ ...bar });
  const { outerSpanMm, widthMm, depthMm } = bar;
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requireFourPointSpans(bar);
  const specimenSlopeNPerMm = slopeWithoutMachine(bar);
  const armMm = momentArmMm(bar);
  const lengthsMm3 =
    at === 'mid-span'
      ? (armMm * (3 * outerSpanMm ** 2 - 4 * armMm ** 2)) / 4
      : armMm ** 2 * (3 * outerSpanMm - 4 * armMm);
  const modulusMPa = (specimenSlopeNPerMm * lengthsMm3) / (widthMm * depthMm ** 3);
  return { specimenSlopeNPerMm, modulusGPa: modulusMPa / mpaPerGpa };
}

function slopeWithoutMachine({ slopeNPerMm, machineMmPerN }: Sloped): number {
  requirePositive({ slopeNPerMm }, 'outside-validity-range');
  requireNotNegative({ machineMmPerN }, 'outside-validity-range');
  const specimenMmPerN = 1 / slopeNPerMm - machineMmPerN;
  // A machine softer than all that was measured: one of the two numbers is wrong.
  requireThat(specimenMmPerN > 0, 'outside-validity-range', 'machineMmPerN');
  return machineMmPerN === 0 ? slopeNPerMm : 1 / specimenMmPerN;
}
