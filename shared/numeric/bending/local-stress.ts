/** Where an origin lies in a bar. */
export type OriginInBar = {
  /** Along the bar from mid-span, signed, mm, at most half the outer span either way. */
  readonly xMm: number;
  /** From the tensile face into the section, mm, from 0 to the depth. */
  readonly yMm: number;
};

/** The stress at an origin, with the two ratios it is made of. */
export type LocalStress = {
  /** On the outer face at the largest moment, MPa, ≥ 0. */
  readonly nominalStressMPa: number;
  /** Moment at x over the largest moment, dimensionless, 0 to 1. */
  readonly momentRatio: number;
  /** 1 − 2y/d, dimensionless, 1 on the tensile face to −1 on the other. */
  readonly depthRatio: number;
  /** Axial stress at the origin, MPa; negative is compression. */
  readonly localStressMPa: number;
};
