import type { CrackRatios, FrontFactors, LoadMode } from './crack-front.ts';

/**
 * Flaw shape parameter Q, dimensionless, 1 to 2.464: the square of E(k), approximated to 0.14 %.
 * Source: Newman and Raju 1981: 1 + 1.464 (minor over major half-axis)^1.65.
 */
export function flawShapeParameter(depthOverHalfLength: number): number {
  return 1 + 1.464 * Math.min(depthOverHalfLength, 1 / depthOverHalfLength) ** 1.65;
}

/** Angular part f_φ of an ellipse, from the depth over the half-length; φ in radians from the end of the half-length. */
export function angularFactor(depthOverHalfLength: number, angleRad: number): number {
  const [sine, cosine] = [Math.sin(angleRad), Math.cos(angleRad)];
  if (depthOverHalfLength <= 1) return ((depthOverHalfLength * cosine) ** 2 + sine ** 2) ** 0.25;
  return ((sine / depthOverHalfLength) ** 2 + cosine ** 2) ** 0.25;
}

/**
 * Bending factor H at one point of the front. `levelOfG22`: the constant term of G22, which alone differs between the
 * surface crack (0.55) and the corner crack (0.64).
 */
export function bendingFactor(crack: CrackRatios, angleRad: number, levelOfG22: number): number {
  const { depthOverHalfLength: shape, depthOverThickness: depth } = crack;
  const minor = Math.min(shape, 1 / shape);
  const power = 0.2 + minor + 0.6 * depth;
  const atSurface = shape <= 1 ? 1 - 0.34 * depth - 0.11 * shape * depth : slenderSurfaceValue(minor, depth);
  const g21 = shape <= 1 ? -1.22 - 0.12 * minor : -2.11 + 0.77 * minor;
  const g22 =
    shape <= 1
      ? levelOfG22 - 1.05 * minor ** 0.75 + 0.47 * minor ** 1.5
      : levelOfG22 - 0.72 * minor ** 0.75 + 0.14 * minor ** 1.5;
  const atDeepest = 1 + g21 * depth + g22 * depth ** 2;
  return atSurface + (atDeepest - atSurface) * Math.sin(angleRad) ** power;
}

/** H1 of a crack that is deeper than its half-length. */
function slenderSurfaceValue(minor: number, depth: number): number {
  const g11 = -0.04 - 0.41 * minor;
  const g12 = 0.55 - 1.93 * minor ** 0.75 + 1.38 * minor ** 1.5;
  return 1 + g11 * depth + g12 * depth ** 2;
}

/** Y = F √(π/Q) in tension, and with H in bending. */
export function frontFactors(crack: CrackRatios, mode: LoadMode, boundary: number, bending: number): FrontFactors {
  const parameter = flawShapeParameter(crack.depthOverHalfLength);
  const inTension = boundary * Math.sqrt(Math.PI / parameter);
  return {
    boundaryFactor: boundary,
    bendingFactor: bending,
    flawShapeParameter: parameter,
    shapeFactor: mode === 'bending' ? bending * inTension : inTension,
  };
}
