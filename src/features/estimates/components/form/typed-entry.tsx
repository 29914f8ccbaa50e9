import { useFormContext, type UseFormRegisterReturn } from 'react-hook-form';
import type { NumberInput } from '#shared/numeric/methods/method.ts';
import { practiceShapeFactors } from '#shared/rules/shape-factors.ts';
import { mirrorBoundaries } from '#shared/vocabulary/mirror-boundaries.ts';
import { uncertaintyForms, uncertaintyFormWords } from '#shared/vocabulary/uncertainty-forms.ts';
import { FieldFrame } from '#src/ui/field-frame.tsx';
import { joinClasses } from '#src/ui/join-classes.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { EstimateDraft } from './draft.ts';

type TypedEntryProps = {
  input: NumberInput;
  /** Which of the two is wrong, told by the element under `errorId`. */
  wrong: 'value' | 'uncertainty' | null;
  errorId: string;
};

/** A typed input: value with unit, its uncertainty, how that is stated, and where it was read. */
export function TypedEntry({ input, wrong, errorId }: TypedEntryProps) {
  const { register } = useFormContext<EstimateDraft>();
  const path = `inputs.${input.name}` as const;
  const isExpected = input.uncertainty === 'expected';
  const toldBy = (part: 'value' | 'uncertainty') => (wrong === part ? errorId : null);
  return (
    <>
      <div
        className={`grid gap-3 [&>*]:min-w-0 ${isExpected ? 'grid-cols-2 min-[640px]:grid-cols-[minmax(0,9fr)_minmax(0,9fr)_minmax(0,18fr)_minmax(0,15fr)]' : 'min-[640px]:grid-cols-2'}`}
      >
        <EntryField
          label={input.openUnit ? 'Value, unit' : 'Value'}
          hint={input.openUnit && input.unit !== '1' ? `in ${input.unit}` : undefined}
          wrongBy={toldBy('value')}
          field={register(`${path}.text`)}
        />
        {isExpected ? (
          <>
            <EntryField label="±, or %" wrongBy={toldBy('uncertainty')} field={register(`${path}.uncertaintyText`)} />
            <SelectField label="± is" {...register(`${path}.uncertaintyAs`)}>
              {uncertaintyForms.map((form) => (
                <option key={form} value={form}>
                  {uncertaintyFormWords[form]}
                </option>
              ))}
            </SelectField>
          </>
        ) : null}
        <TextField label="Read from, or why" {...register(`${path}.note`)} />
      </div>
      {input.name === 'R' || input.name === 'A' ? <BoundaryField name={input.name} /> : null}
      {input.name === 'Y' ? <PracticeValues /> : null}
    </>
  );
}

type EntryFieldProps = { label: string; hint?: string; wrongBy: string | null; field: UseFormRegisterReturn };

/** One line of a group whose error stands under the whole group. */
function EntryField({ label, hint, wrongBy, field }: EntryFieldProps) {
  return (
    <FieldFrame label={label}>
      {({ id }, boxClass) => (
        <div className={joinClasses(boxClass, wrongBy !== null && 'is-wrong')}>
          <input
            type="text"
            autoComplete="off"
            {...field}
            id={id}
            size={1}
            placeholder={hint}
            aria-invalid={wrongBy === null ? undefined : true}
            aria-describedby={wrongBy ?? undefined}
          />
        </div>
      )}
    </FieldFrame>
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
