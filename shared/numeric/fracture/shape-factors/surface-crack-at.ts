import type { CrackRatios, FrontFactors, LoadMode } from './crack-front.ts';
import { angularFactor, bendingFactor, frontFactors } from './front-terms.ts';

/**
 * Factors of a semi-elliptical surface crack at one point of its front, from ratios that the caller has checked; φ in
 * radians, 0 at the surface, π/2 at the deepest point. The width is the half width of the section.
 * Source: Newman and Raju 1981 (NASA TM-83200), 1984 (NASA TM-85793).
 */
export function surfaceCrackAt(crack: CrackRatios, mode: LoadMode, angleRad: number): FrontFactors {
  const { depthOverHalfLength: shape, depthOverThickness: depth, halfLengthOverWidth } = crack;
  const [m1, m2, m3] = shape <= 1 ? shallowTerms(shape) : deepTerms(1 / shape);
  const rise = shape <= 1 ? depth ** 2 : depth ** 2 / shape;
  const surface = 1 + (0.1 + 0.35 * rise) * (1 - Math.sin(angleRad)) ** 2;
  const width = Math.sqrt(1 / Math.cos((Math.PI / 2) * halfLengthOverWidth * Math.sqrt(depth)));
  const boundary = (m1 + m2 * depth ** 2 + m3 * depth ** 4) * surface * angularFactor(shape, angleRad) * width;
  return frontFactors(crack, mode, boundary, bendingFactor(crack, angleRad, 0.55));
}

type Terms = readonly [number, number, number];

/** M1, M2, M3 for a depth up to the half-length; `shape` is a/c. */
function shallowTerms(shape: number): Terms {
  const m3 = 0.5 - 1 / (0.65 + shape) + 14 * (1 - shape) ** 24;
  return [1.13 - 0.09 * shape, -0.54 + 0.89 / (0.2 + shape), m3];
}

/** M1, M2, M3 for a depth above the half-length; `inverse` is c/a. */
function deepTerms(inverse: number): Terms {
  return [Math.sqrt(inverse) * (1 + 0.04 * inverse), 0.2 * inverse ** 4, -0.11 * inverse ** 4];
}
