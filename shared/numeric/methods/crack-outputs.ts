import type { FrontFactors, FrontSummary } from '../fracture/shape-factors/crack-front.ts';
import { codeGiven } from './given.ts';
import type { GivenInputs, MethodOutput, Outputs } from './method.ts';

/** Given only when one place on the front is asked for. */
export const pointOutputs: readonly MethodOutput[] = [
  { name: 'F', label: 'Boundary factor there', symbol: 'F', unit: '1' },
  { name: 'H', label: 'Bending factor there', symbol: 'H', unit: '1' },
  { name: 'Q', label: 'Flaw shape parameter', symbol: 'Q', unit: '1' },
  { name: 'Y', label: 'Shape factor there', symbol: 'Y', unit: '1' },
];

export function pointToOutputs(point: FrontFactors): Outputs {
  return {
    F: point.boundaryFactor,
    H: point.bendingFactor,
    Q: point.flawShapeParameter,
    Y: point.shapeFactor,
  };
}

/** The name of the end where the shape factor is largest, or `between`. */
export function governingPlace(front: FrontSummary, firstEnd: string, secondEnd: string): string {
  if (front.largestAtDegrees === 0) return firstEnd;
  return front.largestAtDegrees === 90 ? secondEnd : 'between';
}

/** The equation with the ratios that go into it. */
export function crackTemplate(given: GivenInputs): string {
  const bending = codeGiven(given, 'mode') === 'bending' ? ' × H' : '';
  return `F${bending} × √(π / Q) at a/c = {a#} / {c#}, a/t = {a#} / {t#}`;
}
