import type { GivenInputs } from '#shared/numeric/methods/method.ts';
import type { MirrorBoundary } from '#shared/vocabulary/mirror-boundaries.ts';
import type { RecordRef } from '../../../lineage/lineage.ts';
import type { InputRow } from '../queries/inputs.ts';

/** An input as it will be kept: in our unit, with its uncertainty and where it comes from. */
export type ResolvedInput = Pick<
  InputRow,
  'name' | 'value' | 'standardUncertainty' | 'unit' | 'distribution' | 'sourceKind' | 'sourceId' | 'sourceNote'
> & {
  readonly enteredText: string | null;
  readonly enteredUnit: string | null;
  readonly enteredUncertainty: string | null;
  readonly boundary: MirrorBoundary | null;
};

/** The inputs as the numeric room takes them. */
export function givenFrom(
  inputs: readonly Pick<InputRow, 'name' | 'value' | 'standardUncertainty' | 'distribution'>[],
): GivenInputs {
  return Object.fromEntries(
    inputs.map(({ name, value, standardUncertainty, distribution }) => [
      name,
      { value, standardUncertainty, distribution },
    ]),
  );
}

/** The record an input was read from; nothing for one that was typed. */
export function sourceOf(input: Pick<InputRow, 'sourceKind' | 'sourceId'>): RecordRef[] {
  if (input.sourceKind === 'typed' || input.sourceId === null) return [];
  return [{ kind: input.sourceKind, id: input.sourceId }];
}
