export type NumberRead =
  { readonly kind: 'read'; readonly number: number } | { readonly kind: 'ambiguous' } | { readonly kind: 'unreadable' };

// One separator followed by exactly three digits after one to three others: 1,234 is a thousand to some, one and a bit to others.
const thousandsOrDecimals = /^[1-9]\d{0,2},\d{3}$/;
const plain = /^\d+(\.\d*)?$|^\.\d+$/;
const decimalComma = /^\d*,\d+$/;
const commaThousands = /^\d{1,3}(,\d{3})+(\.\d+)?$/;
const pointThousands = /^\d{1,3}(\.\d{3})+,\d+$|^\d{1,3}(\.\d{3}){2,}$/;
const spacedThousands = /^\d{1,3}( \d{3})+([.,]\d+)?$/;

/**
 * Reads one number as people type it: decimal point or comma, thousands set off by spaces, true minus, power of ten (1e-3).
 * A comma that could be either is `ambiguous`; the caller asks.
 */
export function readNumber(text: string): NumberRead {
  const [, sign = '', digits = '', power = ''] = /^([+-]?)(.*?)([eE][+-]?\d+)?$/.exec(tidied(text)) ?? [];
  if (thousandsOrDecimals.test(digits)) return { kind: 'ambiguous' };
  const written = withPoint(digits);
  if (written === undefined) return { kind: 'unreadable' };
  const number = Number(`${sign}${written}${power}`);
  return Number.isFinite(number) ? { kind: 'read', number } : { kind: 'unreadable' };
}

function withPoint(digits: string): string | undefined {
  if (plain.test(digits)) return digits;
  if (decimalComma.test(digits)) return digits.replace(',', '.');
  if (commaThousands.test(digits)) return digits.replaceAll(',', '');
  if (pointThousands.test(digits)) return digits.replaceAll('.', '').replace(',', '.');
  if (spacedThousands.test(digits)) return digits.replaceAll(' ', '').replace(',', '.');
  return undefined;
}

/** True minus to hyphen, every kind of space to a plain one. */
function tidied(text: string): string {
  return text
    .trim()
    .replace(/[−–]/g, '-')
    .replace(/\s/g, ' ')
    .replace(/^([+-]) /, '$1');
}
