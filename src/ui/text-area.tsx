import type { ComponentProps } from 'react';
import { FieldFrame, type FieldWords } from './field-frame.tsx';

type TextAreaProps = FieldWords & Omit<ComponentProps<'textarea'>, 'className'>;

/** Several lines of text. */
export function TextArea({ label, help, error, className, id, ...textarea }: TextAreaProps) {
  return (
    <FieldFrame {...{ label, help, error, className, id }}>
      {(described, boxClass) => (
        <div className={boxClass}>
          <textarea rows={3} {...textarea} {...described} />
        </div>
      )}
    </FieldFrame>
  );
}
