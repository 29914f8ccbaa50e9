import type { CrackRatios, FrontFactors, LoadMode } from './crack-front.ts';
import { angularFactor, bendingFactor, frontFactors } from './front-terms.ts';

/**
 * Factors of a quarter-elliptical corner crack at one point of its front, from ratios that the caller has checked; φ in
 * radians, 0 on the face along the width, π/2 on the face along the depth. The width is the full width of the section.
 * Source: Newman and Raju 1984 (NASA TM-85793), equations 37 to 51.
 */
export function cornerCrackAt(crack: CrackRatios, mode: LoadMode, angleRad: number): FrontFactors {
  const { depthOverHalfLength: shape, depthOverThickness: depth } = crack;
  const [m1, m2, m3] = shape <= 1 ? shallowTerms(shape) : deepTerms(1 / shape);
  // the larger of the two half-axes never counts: a/t up to a/c = 1, c/t above it
  const minorOverThickness = shape <= 1 ? depth : depth / shape;
  const g1 = 1 + (0.08 + 0.4 * minorOverThickness ** 2) * (1 - Math.sin(angleRad)) ** 3;
  const g2 = 1 + (0.08 + 0.15 * minorOverThickness ** 2) * (1 - Math.cos(angleRad)) ** 3;
  const boundary =
    (m1 + m2 * depth ** 2 + m3 * depth ** 4) * g1 * g2 * angularFactor(shape, angleRad) * widthFactor(crack);
  return frontFactors(crack, mode, boundary, bendingFactor(crack, angleRad, 0.64));
}

function widthFactor({ halfLengthOverWidth, depthOverThickness }: CrackRatios): number {
  const ratio = halfLengthOverWidth * Math.sqrt(depthOverThickness);
  return 1 - 0.2 * ratio + 9.4 * ratio ** 2 - 19.4 * ratio ** 3 + 27.1 * ratio ** 4;
}

type Terms = readonly [number, number, number];

/** M1, M2, M3 for a depth up to the length along the width; `shape` is a/c. */
function shallowTerms(shape: number): Terms {
  const m3 = -0.5 + 0.25 * shape + 14.8 * (1 - shape) ** 15;
  return [1.08 - 0.03 * shape, -0.44 + 1.06 / (0.3 + shape), m3];
}

/** M1, M2, M3 for a depth above the length along the width; `inverse` is c/a. */
function deepTerms(inverse: number): Terms {
  return [Math.sqrt(inverse) * (1.08 - 0.03 * inverse), 0.375 * inverse ** 2, -0.25 * inverse ** 2];
}
