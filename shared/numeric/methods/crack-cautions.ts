import type { Caution } from './method.ts';

// Range of the ±5 % against finite elements: Newman and Raju 1981, as public implementations quote it.
const leastShape = 0.2;
const largestDepth = 0.8;

/** A surface or corner crack beyond the range for which an accuracy is stated. `shape` a/c, `depth` a/t. */
export function statedRangeCautions(shape: number, depth: number): Caution[] {
  const cautions: Caution[] = [];
  if (shape < leastShape) {
    const sentence = `The crack is shallower than ${leastShape} of its half-length: the equations are stated within ±5 % only from there on.`;
    cautions.push({ code: 'shallow-crack', weight: 'warning', sentence });
  }
  if (depth > largestDepth) {
    const sentence = `The crack is deeper than ${largestDepth} of the section: the equations are stated within ±5 % only up to there.`;
    cautions.push({ code: 'deep-crack', weight: 'warning', sentence });
  }
  return cautions;
}

/** The largest factor lies where the equations fit least. */
export function surfaceGovernsCautions(governs: unknown): Caution[] {
  if (governs !== 'surface') return [];
  const sentence =
    'The largest factor is at the surface: there the equations are a fit, not an exact limit; practice uses it all the same.';
  return [{ code: 'surface-governs', weight: 'note', sentence }];
}
