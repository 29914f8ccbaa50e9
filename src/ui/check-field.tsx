import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field-error.tsx';
import { joinClasses } from './join-classes.ts';

type CheckFieldProps = Omit<ComponentProps<'input'>, 'className'> & {
  label: ReactNode;
  help?: ReactNode;
  error?: ReactNode;
  className?: string;
};

/** A box to tick, or with `type="radio"` one answer of several. The words stand after it. */
export function CheckField({ label, help, error, className, id, ...input }: CheckFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  const describedBy = joinClasses(Boolean(error) && `${fieldId}-error`, Boolean(help) && `${fieldId}-help`);
  return (
    <div className={className}>
      <label htmlFor={fieldId} className="inline-flex items-start gap-2 coarse:min-h-11 coarse:items-center">
        <input
          type="checkbox"
          {...input}
          id={fieldId}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy === '' ? undefined : describedBy}
          className="mt-[3px] flex-none coarse:mt-0"
        />
        <span>{label}</span>
      </label>
      {error ? <FieldError id={`${fieldId}-error`}>{error}</FieldError> : null}
      {help ? (
        <p id={`${fieldId}-help`} className="field-help pl-6">
          {help}
        </p>
      ) : null}
    </div>
  );
}
