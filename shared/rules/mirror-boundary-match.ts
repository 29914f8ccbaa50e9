import type { MirrorBoundary } from '../vocabulary/mirror-boundaries.ts';

const inWords: Readonly<Record<MirrorBoundary, string>> = {
  inner: 'the inner boundary, mirror to mist',
  outer: 'the outer boundary, mist to hackle',
  branching: 'the first branching',
  'not stated': 'a boundary that is not stated',
};

/**
 * Why a mirror radius and a mirror constant may not be used together, in words; null where both name one boundary.
 * A radius read to one boundary with the constant of another gives a wrong stress that looks right.
 */
export function boundaryMismatch(radius: MirrorBoundary, constant: MirrorBoundary): string | null {
  if (radius === constant && radius !== 'not stated') return null;
  if (radius === 'not stated') {
    return `Mirror radius does not say which boundary it was read to, and the constant is of ${inWords[constant]}: state the boundary, or say why they may be used together.`;
  }
  if (constant === 'not stated') {
    return `Mirror constant does not say which boundary it belongs to, and the radius is of ${inWords[radius]}: state the boundary, or say why they may be used together.`;
  }
  return `Mirror radius was read to ${inWords[radius]}, and the constant is of ${inWords[constant]}: take the constant of the same boundary, or say why they may be used together.`;
}
