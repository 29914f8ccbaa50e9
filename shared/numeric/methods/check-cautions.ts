import { mostDeflectionOverSpan } from '../bending/require-small-deflection.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Outputs } from './method.ts';

// Above this the nominal stress is corrected for the edges: trade practice.
const mostEdgeEffect = 0.005;
// Deflection over span from which small-deflection formulas are marked: trade practice.
const largeDeflection = 0.03;
// Stress by the gauge over stress by the load: trade practice.
const gaugePass = { least: 0.98, most: 1.02 };
const gaugeNote = { least: 0.95, most: 1.05 };

/** Edges that change the stress by more than may be left out. */
export function edgeCautions(outputs: Outputs): Caution[] {
  const { stressFactor } = outputs;
  if (typeof stressFactor !== 'number' || stressFactor - 1 <= mostEdgeEffect) return [];
  const percent = (100 * (stressFactor - 1)).toFixed(2);
  const sentence = `The edges raise the stress by ${percent} %: correct the nominal stress, and say so.`;
  return [{ code: 'correct-edges', weight: 'warning', sentence }];
}

/** A deflection that is large against the span of that name. */
export function deflectionCautions(given: GivenInputs, span: string): Caution[] {
  if (numberGiven(given, 'deflection') <= largeDeflection * numberGiven(given, span)) return [];
  const sentence = `The deflection is more than ${largeDeflection} of the span: formulas for small deflection begin to fail, and above ${mostDeflectionOverSpan} they are not used.`;
  return [{ code: 'large-deflection', weight: 'warning', sentence }];
}

/** A modulus for which nothing was taken off for the machine: trade practice. */
export function apparentModulusCautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'machineCompliance') !== 0) return [];
  const sentence =
    'Nothing is taken off for the machine: from crosshead travel this is only the apparent modulus, too low by up to tens of per cent.';
  return [{ code: 'apparent-modulus', weight: 'note', sentence }];
}

/** How far gauge and beam agree. */
export function gaugeCautions(outputs: Outputs): Caution[] {
  const { ratio } = outputs;
  if (typeof ratio !== 'number' || (ratio >= gaugePass.least && ratio <= gaugePass.most)) return [];
  if (ratio >= gaugeNote.least && ratio <= gaugeNote.most) {
    const sentence = 'Gauge and load differ by 2 to 5 %.';
    return [{ code: 'gauge-differs', weight: 'note', sentence }];
  }
  const sentence =
    'Gauge and load differ by more than 5 %: stop, and look for a wrong span, friction, twist, a wrong gauge factor or modulus.';
  return [{ code: 'gauge-disagrees', weight: 'warning', sentence }];
}

/** What limits the error of stuck bearings: trade practice. */
export function frictionCautions(): Caution[] {
  const sentence = 'An upper bound, for bearings that cannot roll and slide fully: report it with its sign.';
  return [{ code: 'upper-bound', weight: 'note', sentence }];
}
