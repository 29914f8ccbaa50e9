import { useFormContext } from 'react-hook-form';
import type { NumberInput } from '#shared/numeric/methods/method.ts';
import { practiceShapeFactors } from '#shared/rules/shape-factors.ts';
import { mirrorBoundaries } from '#shared/vocabulary/mirror-boundaries.ts';
import { uncertaintyForms, uncertaintyFormWords } from '#shared/vocabulary/uncertainty-forms.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { EstimateDraft } from './draft.ts';

/** A typed input: value with unit, its uncertainty, how that is stated, and where it was read. */
export function TypedEntry({ input, isWrong }: { input: NumberInput; isWrong: boolean }) {
  const { register } = useFormContext<EstimateDraft>();
  const path = `inputs.${input.name}` as const;
  const isExpected = input.uncertainty === 'expected';
  return (
    <>
      <div className={`grid gap-3 ${isExpected ? 'grid-cols-2 min-[640px]:grid-cols-[1fr_1fr_1.4fr]' : ''}`}>
        <TextField
          label={input.openUnit ? 'Value with unit' : 'Value'}
          autoComplete="off"
          aria-invalid={isWrong || undefined}
          {...register(`${path}.text`)}
        />
        {isExpected ? (
          <>
            <TextField label="±, or %" autoComplete="off" {...register(`${path}.uncertaintyText`)} />
            <SelectField
              label="± is"
              className="col-span-2 min-[640px]:col-span-1"
              {...register(`${path}.uncertaintyAs`)}
            >
              {uncertaintyForms.map((form) => (
                <option key={form} value={form}>
                  {uncertaintyFormWords[form]}
                </option>
              ))}
            </SelectField>
          </>
        ) : null}
      </div>
      {input.name === 'R' || input.name === 'A' ? <BoundaryField name={input.name} /> : null}
      {input.name === 'Y' ? <PracticeValues /> : null}
      <TextField label="Where it was read, or why it is so" {...register(`${path}.note`)} />
    </>
  );
}

function BoundaryField({ name }: { name: string }) {
  const { register } = useFormContext<EstimateDraft>();
  return (
    <SelectField label="Boundary of the mirror" {...register(`inputs.${name}.boundary`)}>
      <option value="">choose which edge it is of</option>
      {mirrorBoundaries.map((boundary) => (
        <option key={boundary} value={boundary}>
          {boundary}
        </option>
      ))}
    </SelectField>
  );
}

/** The practice values, each put in with a press, beside what the full equation gives for a small flaw. */
function PracticeValues() {
  const { setValue } = useFormContext<EstimateDraft>();
  return (
    <p className="text-s text-ink-2">
      Practice values:{' '}
      {practiceShapeFactors.map((each, index) => (
        <span key={each.shape}>
          <button
            type="button"
            className="choice whitespace-nowrap"
            onClick={() => {
              setValue('inputs.Y.text', each.text, { shouldDirty: true });
              setValue('inputs.Y.note', `${each.shape}, practice value`, { shouldDirty: true });
            }}
          >
            {each.text} {each.shape}
          </button>{' '}
          <span className="whitespace-nowrap">(full equation {each.fullEquation})</span>
          {index < practiceShapeFactors.length - 1 ? '; ' : '.'}
        </span>
      ))}
    </p>
  );
}
