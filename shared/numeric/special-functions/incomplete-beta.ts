import { logGamma } from './log-gamma.ts';

const mostTerms = 300;
const enough = 1e-15;
const tiny = 1e-300;

/**
 * Regularised incomplete beta function I_x(a, b), 0 to 1; `x` 0 to 1, `a` and `b` > 0.
 * Accurate to about 1e-13 for a and b up to some thousands.
 * Source: continued fraction DLMF 8.17.22, by the method of Lentz.
 */
export function incompleteBeta(of: { readonly x: number; readonly a: number; readonly b: number }): number {
  const { x, a, b } = of;
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  // the fraction runs fast on this side only; the other side is the complement
  if (x > (a + 1) / (a + b + 2)) return 1 - incompleteBeta({ x: 1 - x, a: b, b: a });
  const logFront = a * Math.log(x) + b * Math.log1p(-x) + logGamma(a + b) - logGamma(a) - logGamma(b);
  return (Math.exp(logFront) / a) * fraction(x, a, b);
}

function fraction(x: number, a: number, b: number): number {
  let c = 1;
  let d = 1 / held(1 - ((a + b) * x) / (a + 1));
  let value = d;
  for (let m = 1; m <= mostTerms; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / held(1 + even * d);
    c = held(1 + even / c);
    value *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / held(1 + odd * d);
    c = held(1 + odd / c);
    value *= d * c;
    if (Math.abs(d * c - 1) < enough) break;
  }
  return value;
}

function held(value: number): number {
  return Math.abs(value) < tiny ? tiny : value;
}
