import { OutsideDomain } from '../outside-domain.ts';
import type { GivenInputs } from './method.ts';

/** The number given under a name; NaN when there is none, which every formula refuses as missing. */
export function numberGiven(given: GivenInputs, name: string): number {
  return optionalNumberGiven(given, name) ?? Number.NaN;
}

/** The number given under a name, or nothing. */
export function optionalNumberGiven(given: GivenInputs, name: string): number | undefined {
  const input = given[name];
  return input && 'value' in input ? input.value : undefined;
}

/** The standard uncertainty stated with a number, or nothing. */
export function uncertaintyGiven(given: GivenInputs, name: string): number | undefined {
  const input = given[name];
  return input && 'value' in input ? input.standardUncertainty : undefined;
}

/** The numbers of a list given under a name; empty when there is none. */
export function listGiven(given: GivenInputs, name: string): readonly number[] {
  const input = given[name];
  return input && 'values' in input ? input.values : [];
}

/** The word chosen under a name, or nothing. */
export function codeGiven(given: GivenInputs, name: string): string | undefined {
  const input = given[name];
  return input && 'code' in input ? input.code : undefined;
}

/** The word chosen under a name, one of the choices; any other, or none, is refused. */
export function choiceGiven<Choice extends string>(
  given: GivenInputs,
  name: string,
  choices: readonly Choice[],
): Choice {
  const chosen = choices.find((choice) => choice === codeGiven(given, name));
  if (chosen === undefined) throw new OutsideDomain('not-a-choice', name);
  return chosen;
}
