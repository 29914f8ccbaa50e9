// Stress-intensity factors of elliptical cracks: Newman and Raju's equations, each public method in a file of its own.

/** How the section is loaded: tension, or bending with the outer-fibre stress. */
export type LoadMode = 'tension' | 'bending';

/** An elliptical crack by ratios, so that a limit (a section without end) is a 0. */
export type CrackRatios = {
  /** Depth over half-length, a/c, > 0. */
  readonly depthOverHalfLength: number;
  /** Depth over thickness, a/t, ≥ 0 and < 1; 0 for a flaw that is small against the section. */
  readonly depthOverThickness: number;
  /** Half-length over the width that the equation takes, c/b, ≥ 0 and < 0.5; 0 in a wide section. */
  readonly halfLengthOverWidth: number;
};

/** The factors at one point of the front, dimensionless; the shape factor has √π inside. */
export type FrontFactors = {
  readonly boundaryFactor: number;
  readonly bendingFactor: number;
  readonly flawShapeParameter: number;
  readonly shapeFactor: number;
};

export type FrontSummary = {
  /** At φ = 0. */
  readonly firstEndFactor: number;
  /** At φ = 90°. */
  readonly secondEndFactor: number;
  readonly largestFactor: number;
  /** Parametric angle of the largest, degrees, 0 to 90. */
  readonly largestAtDegrees: number;
};

export const radiansFromDegrees = (degrees: number) => (degrees * Math.PI) / 180;
