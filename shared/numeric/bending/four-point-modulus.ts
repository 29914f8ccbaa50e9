import { requireFinite, requirePositive } from '../require.ts';
import type { DeflectionPlace } from './four-point-strain.ts';
import { mpaPerGpa } from './gauge-modulus.ts';
import { momentArmMm, requireFourPointSpans, type FourPointSpans } from './require-spans.ts';
import { slopeWithoutMachine, type ModulusFromSlope, type SlopedBar } from './slope-without-machine.ts';

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
export function fourPointModulus(bar: SlopedBar & FourPointSpans, at: DeflectionPlace): ModulusFromSlope {
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
