// Rational approximations of Wichura, AS 241 (PPND16), Appl. Statist. 37 (1988) 477; constants as printed,
// to the digits a number holds.
const central = {
  over: [
    3.3871328727963665, 133.14166789178438, 1971.5909503065513, 13731.69376550946, 45921.95393154987, 67265.7709270087,
    33430.57558358813, 2509.0809287301227,
  ],
  under: [
    1, 42.31333070160091, 687.1870074920579, 5394.196021424751, 21213.794301586597, 39307.89580009271,
    28729.085735721943, 5226.495278852546,
  ],
};
const nearTail = {
  over: [
    1.4234371107496835, 4.630337846156546, 5.769497221460691, 3.6478483247632045, 1.2704582524523684,
    0.2417807251774506, 0.022723844989269184, 0.0007745450142783414,
  ],
  under: [
    1, 2.053191626637759, 1.6763848301838038, 0.6897673349851, 0.14810397642748008, 0.015198666563616457,
    0.0005475938084995345, 1.0507500716444169e-9,
  ],
};
const farTail = {
  over: [
    6.657904643501103, 5.463784911164114, 1.7848265399172913, 0.29656057182850487, 0.026532189526576124,
    0.0012426609473880784, 2.7115555687434876e-5, 2.0103343992922881e-7,
  ],
  under: [
    1, 0.599832206555888, 0.1369298809227358, 0.014875361290850615, 0.0007868691311456133, 1.8463183175100548e-5,
    1.421511758316446e-7, 2.0442631033899397e-15,
  ],
};

/**
 * Standard normal quantile: the number below which a share `probability` of a normal spread lies. −∞ at 0, +∞ at 1.
 * Relative error about 1e-16.
 * Source: Wichura, AS 241, routine PPND16.
 * @example inverseNormal(0.975) // 1.95996…
 */
export function inverseNormal(probability: number): number {
  const fromMiddle = probability - 0.5;
  if (Math.abs(fromMiddle) <= 0.425) return fromMiddle * ratio(central, 0.180625 - fromMiddle ** 2);
  const tail = fromMiddle < 0 ? probability : 1 - probability;
  if (tail <= 0) return fromMiddle < 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
  const depth = Math.sqrt(-Math.log(tail));
  const size = depth <= 5 ? ratio(nearTail, depth - 1.6) : ratio(farTail, depth - 5);
  return fromMiddle < 0 ? -size : size;
}

function ratio(of: { over: readonly number[]; under: readonly number[] }, x: number): number {
  return polynomial(of.over, x) / polynomial(of.under, x);
}

function polynomial(coefficients: readonly number[], x: number): number {
  let value = 0;
  for (let index = coefficients.length - 1; index >= 0; index -= 1) value = value * x + (coefficients[index] ?? 0);
  return value;
}
