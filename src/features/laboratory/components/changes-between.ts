export type Change = { field: string; before: string; after: string };

/** What differs between the two sides of an act, field by field, as words; an empty side is an empty text. */
export function changesBetween(before: unknown, after: unknown): Change[] {
  const [one, other] = [fieldsOf(before), fieldsOf(after)];
  return [...new Set([...one.keys(), ...other.keys()])]
    .map((field) => ({ field, before: one.get(field) ?? '', after: other.get(field) ?? '' }))
    .filter((change) => change.before !== change.after);
}

function fieldsOf(value: unknown): Map<string, string> {
  if (value === null || value === undefined) return new Map();
  if (typeof value !== 'object' || Array.isArray(value)) return new Map([['', inWords(value)]]);
  return new Map(Object.entries(value).map(([field, held]) => [spaced(field), inWords(held)]));
}

function inWords(value: unknown): string {
  if (value === null || value === undefined) return '';
  if (Array.isArray(value)) return value.map(inWords).join(', ');
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'object')
    return Object.entries(value)
      .map(([field, held]) => `${spaced(field)} ${inWords(held)}`)
      .join(', ');
  return String(value);
}

/** "roomyRows" reads "roomy rows". */
function spaced(field: string): string {
  return field.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
}
