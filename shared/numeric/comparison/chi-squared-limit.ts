// 95 % points by degrees of freedom.
const limits: Readonly<Record<number, number>> = { 1: 3.841, 2: 5.991 };

/** What χ² of two or three stresses about their common value must not exceed at 95 %; nothing for other counts. */
export function chiSquaredLimit(stresses: number): number | undefined {
  return limits[stresses - 1];
}
