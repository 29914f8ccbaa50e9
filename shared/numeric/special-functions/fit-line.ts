export type FittedLine = {
  readonly slope: number;
  readonly intercept: number;
  readonly uSlope: number;
  readonly uIntercept: number;
  /** n − 2. */
  readonly degreesOfFreedom: number;
};

/**
 * Straight line y = intercept + slope·x by ordinary least squares, with standard uncertainties from the scatter.
 * `points`: n ≥ 3. Nothing when all x are alike; uncertainties of 0 when the points lie on the line to rounding.
 * Source: closed sums; s² = RSS/(n − 2), u(slope) = s/√Sxx, u(intercept) = s√(1/n + x̄²/Sxx).
 */
export function fitLine(points: readonly { readonly x: number; readonly y: number }[]): FittedLine | undefined {
  const n = points.length;
  const meanX = points.reduce((sum, { x }) => sum + x, 0) / n;
  const meanY = points.reduce((sum, { y }) => sum + y, 0) / n;
  const sxx = points.reduce((sum, { x }) => sum + (x - meanX) ** 2, 0);
  const sizeX = points.reduce((sum, { x }) => sum + x ** 2, 0);
  // below this share of Σx² the spread of x is rounding
  if (!(sxx > sizeX * 1e-24)) return undefined;
  const sxy = points.reduce((sum, { x, y }) => sum + (x - meanX) * (y - meanY), 0);
  const slope = sxy / sxx;
  const intercept = meanY - slope * meanX;
  const squares = points.reduce((sum, { x, y }) => sum + (y - intercept - slope * x) ** 2, 0);
  const sizeY = points.reduce((sum, { y }) => sum + y ** 2, 0);
  const s = squares > sizeY * 1e-26 ? Math.sqrt(squares / (n - 2)) : 0;
  return {
    slope,
    intercept,
    uSlope: s / Math.sqrt(sxx),
    uIntercept: s * Math.sqrt(1 / n + meanX ** 2 / sxx),
    degreesOfFreedom: n - 2,
  };
}
