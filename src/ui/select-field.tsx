import { CaretDownIcon } from '@phosphor-icons/react/dist/csr/CaretDown';
import type { ComponentProps } from 'react';
import { FieldFrame, type FieldWords } from './field-frame.tsx';

type SelectFieldProps = FieldWords & Omit<ComponentProps<'select'>, 'className'>;

/** One of a short list. The options are its children. */
export function SelectField({ label, help, error, className, id, children, ...select }: SelectFieldProps) {
  return (
    <FieldFrame {...{ label, help, error, className, id }}>
      {(described, boxClass) => (
        <div className={`${boxClass} relative`}>
          <select {...select} {...described}>
            {children}
          </select>
          <CaretDownIcon size={13} aria-hidden className="pointer-events-none absolute right-[10px]" />
        </div>
      )}
    </FieldFrame>
  );
}
