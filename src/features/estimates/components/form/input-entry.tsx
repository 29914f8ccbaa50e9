import { useFormContext, useWatch } from 'react-hook-form';
import type { NumberInput } from '#shared/numeric/methods/method.ts';
import { FieldError } from '#src/ui/field-error.tsx';
import { SetText } from '../set-text.tsx';
import { SymbolWord } from '../symbol-word.tsx';
import { ConstantChoice } from './constant-choice.tsx';
import { waysOf, type EstimateDraft } from './draft.ts';
import type { InputPreview, Offered } from './preview.ts';
import { ReadingChoice } from './reading-choice.tsx';
import { TypedEntry } from './typed-entry.tsx';

const wayWords = { typed: 'typed', mark: 'from a mark', constant: 'from the material' } as const;

type InputEntryProps = { input: NumberInput; preview: InputPreview; offered: Offered };

/** One input of a method: typed with its unit and ±, read off a mark, or taken from the material; and what it reads. */
export function InputEntry({ input, preview, offered }: InputEntryProps) {
  const { register, formState, getFieldState } = useFormContext<EstimateDraft>();
  const from = useWatch<EstimateDraft, `inputs.${string}.from`>({ name: `inputs.${input.name}.from` });
  const ways = waysOf(input.name);
  const path = `inputs.${input.name}` as const;
  const kept = getFieldState(`${path}.from`, formState).error?.message;
  const wasLeft =
    formState.touchedFields.inputs?.[input.name]?.text || formState.touchedFields.inputs?.[input.name]?.uncertaintyText;
  const error = kept ?? (preview.kind === 'wrong' && wasLeft ? preview.reason : undefined);
  const errorId = `${path}-error`;
  const echo = preview.kind === 'empty' ? undefined : preview.echo;
  return (
    <fieldset className="min-w-0 border-t border-hairline pt-[10px]" aria-describedby={error ? errorId : undefined}>
      <legend className="float-left mb-1 flex w-full flex-wrap items-baseline justify-between gap-x-4">
        <span className="font-semibold">
          {input.label} <SymbolWord symbol={input.symbol} />
          {input.optional ? <span className="font-normal text-ink-2">, if known</span> : null}
        </span>
        {ways.length > 1 ? (
          <span className="flex gap-4 text-s text-ink-2">
            {ways.map((way) => (
              <label key={way} className="inline-flex items-center gap-[6px] coarse:min-h-11">
                <input type="radio" value={way} {...register(`${path}.from`)} />
                {wayWords[way]}
              </label>
            ))}
          </span>
        ) : null}
      </legend>
      <div className="clear-both grid grid-cols-[minmax(0,1fr)] gap-[6px]">
        {from === 'typed' ? (
          <TypedEntry input={input} wrong={error === undefined ? null : partOf(preview)} errorId={errorId} />
        ) : null}
        {from === 'mark' ? <ReadingChoice input={input} measurements={offered.measurements} /> : null}
        {from === 'constant' ? <ConstantChoice input={input} constants={offered.constants} /> : null}
        {error ? <FieldError id={errorId}>{error}</FieldError> : null}
        <p className="text-s text-ink-2">
          {echo ? (
            <output>
              <SetText text={echo} />
            </output>
          ) : (
            <SetText text={input.limits} />
          )}
        </p>
      </div>
    </fieldset>
  );
}

/** Which of the two typings is wrong; the value where the server refused and the page had nothing against it. */
function partOf(preview: InputPreview): 'value' | 'uncertainty' {
  return preview.kind === 'wrong' ? preview.part : 'value';
}
