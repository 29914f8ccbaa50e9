const words = [
  ...['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve'],
  ...['thirteen', 'fourteen', 'fifteen', 'sixteen', 'seventeen', 'eighteen', 'nineteen', 'twenty'],
];

/** A count in a sentence: in words up to twenty, then in digits. */
export function countInWords(count: number): string {
  return words[count] ?? String(count);
}

/** "one case", "three cases". */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${countInWords(count)} ${count === 1 ? one : many}`;
}

/** A sentence with its first letter capital. */
export function asSentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
