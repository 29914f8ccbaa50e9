/**
 * Paths in an answer where a stress stands without its U: a number named for its MPa, or beside the unit MPa, whose
 * object has no uncertainty of its own. What is itself an uncertainty is left out.
 */
export function stressesWithoutInterval(answer: unknown, path: readonly string[] = []): string[] {
  if (Array.isArray(answer))
    return answer.flatMap((each, index) => stressesWithoutInterval(each, [...path, `${index}`]));
  if (typeof answer !== 'object' || answer === null) return [];
  const entries = Object.entries(answer);
  const has = (name: RegExp) =>
    entries.some(([key, value]) => name.test(key) && typeof value === 'number' && value > 0);
  const hasInterval = has(/uncertainty/i);
  const isStress =
    entries.some(([key, value]) => key === 'unit' && value === 'MPa') ||
    entries.some(([key, value]) => /stressMPa$/i.test(key) && typeof value === 'number');
  const here = isStress && !hasInterval ? [path.join('.')] : [];
  return [...here, ...entries.flatMap(([key, value]) => stressesWithoutInterval(value, [...path, key]))];
}
