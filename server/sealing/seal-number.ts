// Crockford's 32 signs: no I, L, O or U, so that none is mistaken for a digit or for another.
const signs = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const bitsASign = 5;
const signCount = 12;
const groupLength = 4;
// x⁵ + x² + 1, under which 2 generates every sign but 0: its powers weigh the places, all differently.
const fieldPolynomial = 0b100101;

/**
 * The number a seal is told by: the first 60 bits of the digest in twelve signs and a check sign, "7QK4-M2XD-91HV-T".
 * @throws Error for what is not a SHA-256 in hexadecimal
 */
export function sealNumberOf(digestHex: string): string {
  if (!/^[0-9a-f]{64}$/.test(digestHex)) throw new Error('a seal number is made from a SHA-256 in hexadecimal');
  const bits = BigInt(`0x${digestHex.slice(0, (signCount * bitsASign) / 4)}`);
  const values = Array.from({ length: signCount }, (_, place) =>
    Number((bits >> BigInt(bitsASign * (signCount - 1 - place))) & 31n),
  );
  return inGroups([...values, checkOf(values)].map((value) => signs[value]).join(''));
}

/**
 * A seal number as a person typed it, in the form it is kept: capitals or not, with or without dashes, O for 0, I or L
 * for 1. Null where it is none: a wrong length, a wrong sign, or any one sign wrong or two signs changed about.
 */
export function readSealNumber(typed: string): string | null {
  const plain = typed
    .toUpperCase()
    .replace(/[\s‐-―-]/g, '')
    .replaceAll('O', '0')
    .replace(/[IL]/g, '1');
  const values = [...plain].map((sign) => signs.indexOf(sign));
  if (values.length !== signCount + 1 || values.includes(-1)) return null;
  return checkOf(values.slice(0, signCount)) === values[signCount] ? inGroups(plain) : null;
}

/** Sum over the field of 32 of each sign times the power of its place; the check sign itself weighs 1. */
function checkOf(values: readonly number[]): number {
  return values.reduce((check, value) => double(check ^ value), 0);
}

function double(value: number): number {
  const doubled = value << 1;
  return doubled > 31 ? doubled ^ fieldPolynomial : doubled;
}

function inGroups(plain: string): string {
  return plain.match(new RegExp(`.{1,${groupLength}}`, 'g'))?.join('-') ?? plain;
}
