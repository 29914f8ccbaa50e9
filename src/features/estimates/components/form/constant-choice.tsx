import { useFormContext } from 'react-hook-form';
import type { ConstantView } from '#shared/contracts/materials.ts';
import type { NumberInput } from '#shared/numeric/methods/method.ts';
import { sourcesOfInput } from '#shared/rules/input-sources.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import { inputText } from '#shared/wording/input-quantity.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import type { EstimateDraft } from './draft.ts';

type ConstantChoiceProps = { input: NumberInput; constants: readonly ConstantView[] };

/** An input that is a constant of the material, from the records in force. */
export function ConstantChoice({ input, constants }: ConstantChoiceProps) {
  const { register, getValues } = useFormContext<EstimateDraft>();
  const chosen = getValues(`inputs.${input.name}.constantId`);
  const kinds = sourcesOfInput(input.name).constants;
  const fitting = constants.filter(
    (each) => kinds.includes(each.kind) && (each.supersededById === null || each.id === chosen),
  );
  if (fitting.length === 0) {
    return (
      <p className="text-s text-ink-2">
        The material has no {kinds.map((kind) => constantKindTable[kind].word).join(' or ')} on record.
      </p>
    );
  }
  return (
    <SelectField label="Constant on record" {...register(`inputs.${input.name}.constantId`)}>
      <option value="">choose a record</option>
      {fitting.map((each) => (
        <option key={each.id} value={each.id}>
          {constantKindTable[each.kind].word},{' '}
          {inputText({ value: each.value, standardUncertainty: each.standardUncertainty, unit: input.unit })}, record{' '}
          {each.recordNumber}
          {each.supersededById === null ? '' : ', replaced since'}
        </option>
      ))}
    </SelectField>
  );
}
