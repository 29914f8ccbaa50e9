const g = 7;
// Lanczos coefficients for g = 7, n = 9; relative error below 1e-14 for positive arguments.
const first = 0.99999999999980993;
const rest = [
  676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905,
  -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
];

/**
 * Natural logarithm of the gamma function of a positive number.
 * Source: Lanczos approximation, SIAM J. Numer. Anal. B 1 (1964) 86.
 * @example logGamma(5) // ln 24 = 3.178…
 */
export function logGamma(x: number): number {
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x);
  const z = x - 1;
  const sum = rest.reduce((total, coefficient, index) => total + coefficient / (z + index + 1), first);
  const t = z + g + 0.5;
  return 0.5 * Math.log(2 * Math.PI) + (z + 0.5) * Math.log(t) - t + Math.log(sum);
}
