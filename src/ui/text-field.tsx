import type { ComponentProps } from 'react';
import { FieldFrame, type FieldWords } from './field-frame.tsx';
import { joinClasses } from './join-classes.ts';

type TextFieldProps = FieldWords & Omit<ComponentProps<'input'>, 'className'> & { mono?: boolean };

/** One line of text. `mono` for numbers of cases, lots, seals and keys. */
export function TextField({ label, help, error, className, mono, id, ...input }: TextFieldProps) {
  return (
    <FieldFrame {...{ label, help, error, className, id }}>
      {(described, boxClass) => (
        <div className={boxClass}>
          <input type="text" {...input} {...described} className={joinClasses(mono && 'mono')} />
        </div>
      )}
    </FieldFrame>
  );
}
