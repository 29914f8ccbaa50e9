import { useFormContext } from 'react-hook-form';
import type { MeasurementView } from '#shared/contracts/marks.ts';
import type { NumberInput } from '#shared/numeric/methods/method.ts';
import { sourcesOfInput } from '#shared/rules/input-sources.ts';
import { inputText } from '#shared/wording/input-quantity.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { EstimateDraft } from './draft.ts';

type ReadingChoiceProps = { input: NumberInput; measurements: readonly MeasurementView[] };

/** An input read off a mark of this case, with the reader's own uncertainty where the reading's is too small. */
export function ReadingChoice({ input, measurements }: ReadingChoiceProps) {
  const { register } = useFormContext<EstimateDraft>();
  const fitting = measurements.filter((each) => sourcesOfInput(input.name).quantities.includes(each.quantity));
  if (fitting.length === 0) {
    return (
      <p className="text-s text-ink-2">No mark of this case says a {sourcesOfInput(input.name).quantities[0]} yet.</p>
    );
  }
  return (
    <div className="grid gap-3 min-[640px]:grid-cols-[minmax(0,2fr)_minmax(0,1fr)] [&>*]:min-w-0">
      <SelectField label="Mark" {...register(`inputs.${input.name}.reading`)}>
        <option value="">choose a mark</option>
        {fitting.map((each) => (
          <option key={`${each.markId} ${each.quantity}`} value={`${each.markId} ${each.quantity}`}>
            {readingWords(each)}
          </option>
        ))}
      </SelectField>
      <TextField
        label="Own u, %"
        inputMode="decimal"
        autoComplete="off"
        placeholder="as read"
        {...register(`inputs.${input.name}.percent`)}
      />
    </div>
  );
}

function readingWords(each: MeasurementView): string {
  const length =
    each.valueMm === null || each.standardUncertaintyMm === null
      ? `${formatNumber(each.valuePx, { decimals: 0 })} px, uncalibrated`
      : inputText({ value: each.valueMm, standardUncertainty: each.standardUncertaintyMm, unit: 'mm' });
  const boundary = each.boundary ? `, ${each.boundary} boundary` : '';
  return `m${each.markNumber}, Fig. ${each.figureNumber}: ${each.quantity} ${length}${boundary}`;
}
