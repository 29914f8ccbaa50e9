import { methodOfListed, reckonListed } from '#shared/rules/reckon-listed.ts';
import type { CheckValue } from './check-values.ts';

export type Answer = Readonly<Record<string, unknown>>;

/** Whether a reference method can be run. */
export function canRun(method: string): boolean {
  return methodOfListed(method) !== undefined;
}

/** What a method gives for the inputs of a reference value: its outputs by name, or its refusal. */
export function runCheckValue({ id, method, inputs }: CheckValue): Answer {
  const answer = reckonListed({ id, method, inputs });
  if ('refused' in answer) return { refusal: answer.refused };
  return Object.fromEntries(Object.entries(answer.outputs).map(([name, { value }]) => [name, value]));
}
