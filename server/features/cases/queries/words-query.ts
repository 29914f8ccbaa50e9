/**
 * Typed words as a PostgreSQL text query: every word must stand in the case, each may be the beginning of one. A word
 * of digits also finds the parts of a number after its hyphen, which the parser reads as a sign.
 * @example wordsQuery('seal 0001') // "('seal':*) & ('0001':* | '-0001':*)"
 */
export function wordsQuery(typed: string): string {
  return typed
    .split(/\s+/)
    .map((word) => word.replace(/['\\\0]/g, ''))
    .filter((word) => /[\p{L}\p{N}]/u.test(word))
    .map((word) => (/^\d/.test(word) ? `('${word}':* | '-${word}':*)` : `('${word}':*)`))
    .join(' & ');
}
