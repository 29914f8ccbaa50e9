import type { ComponentProps, ReactNode } from 'react';
import { FieldFrame, type FieldWords } from './field-frame.tsx';
import { UnitWord } from './quantity.tsx';

type InputProps = Omit<ComponentProps<'input'>, 'className'>;

type UnitFieldProps = FieldWords & {
  /** The unit, shown inside the field at its right; empty for a pure number. */
  unit: string;
  /** The input of the value. */
  entry: InputProps;
  /** The input of ±, its expanded uncertainty in the same unit. Left out where none is asked for. */
  plusMinus?: InputProps;
  /** The typing in another unit, kept in words: "0.1173 in". */
  typedAs?: ReactNode;
  /** The field's name in plain text, for the label of ±; needed where `label` is not a string. */
  name?: string;
};

/** A measured value: the value, then ± where one is asked for, then the one unit they share. */
export function UnitField({ unit, entry, plusMinus, typedAs, name, help, ...words }: UnitFieldProps) {
  const plainName = name ?? (typeof words.label === 'string' ? words.label : 'the value');
  const typed = typedAs ? <>typed as {typedAs}</> : null;
  const helpLine =
    typed && help ? (
      <>
        {typed}; {help}
      </>
    ) : (
      (typed ?? help)
    );
  return (
    <FieldFrame {...words} help={helpLine} id={entry.id}>
      {(described, boxClass) => (
        <div className={boxClass}>
          <input
            type="text"
            inputMode="decimal"
            autoComplete="off"
            {...entry}
            {...described}
            className="num"
            size={1}
          />
          {plusMinus ? (
            <>
              <span className="plus-minus" aria-hidden>
                ±
              </span>
              <input
                type="text"
                inputMode="decimal"
                autoComplete="off"
                {...plusMinus}
                aria-label={`± of ${plainName}${unit === '' ? '' : `, in ${unit}`}`}
                aria-invalid={described['aria-invalid']}
                aria-describedby={described['aria-describedby']}
                className="num !max-w-[38%]"
                size={1}
              />
            </>
          ) : null}
          {unit === '' ? null : (
            <span className="unit">
              <UnitWord unit={unit} />
            </span>
          )}
        </div>
      )}
    </FieldFrame>
  );
}
