/** The size and lie of an ellipse, in image px. */
export type HalfAxes = {
  /** Larger half-axis, px, > 0. */
  readonly majorPx: number;
  /** Smaller half-axis, px, > 0, ≤ the larger. */
  readonly minorPx: number;
  /** From the image's x axis to the larger half-axis, clockwise on the screen, degrees, 0 ≤ angle < 180. */
  readonly majorAngleDeg: number;
};
