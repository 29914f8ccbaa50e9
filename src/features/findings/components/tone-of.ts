import type { PersonWriting } from '#src/collaboration/findings-text.ts';

/** Others have one of three colours each, by a settled order, the same in carets, outline and head of one page. */
export function toneOf(people: readonly PersonWriting[], personId: string): number {
  const others = [...new Set(people.filter((each) => !each.isSelf).map((each) => each.personId))].sort();
  return Math.max(0, others.indexOf(personId)) % 3;
}
