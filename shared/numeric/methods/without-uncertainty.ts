import type { NumberInput } from './method.ts';

/** The same input for a check or a factor, which is asked for as it stands and carries no uncertainty. */
export function withoutUncertainty(input: NumberInput): NumberInput {
  return { ...input, uncertainty: 'none' };
}
