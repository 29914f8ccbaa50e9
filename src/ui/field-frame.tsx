import { useId, type ReactNode } from 'react';
import { FieldError } from './field-error.tsx';
import { joinClasses } from './join-classes.ts';

/** What every field shares: words above it, help and fault below it. */
export type FieldWords = { label: ReactNode; help?: ReactNode; error?: ReactNode; className?: string };

type Described = { id: string; 'aria-invalid': true | undefined; 'aria-describedby': string | undefined };

type FieldFrameProps = FieldWords & {
  /** An id given by the form; one is made where none is given. */
  id?: string;
  children: (described: Described, boxClass: string) => ReactNode;
};

/** Label above, then the field, its error line and its help line, tied together for a screen reader. */
export function FieldFrame({ label, help, error, className, id, children }: FieldFrameProps) {
  const made = useId();
  const fieldId = id ?? made;
  const errorId = `${fieldId}-error`;
  const helpId = `${fieldId}-help`;
  const describedBy = joinClasses(Boolean(error) && errorId, Boolean(help) && helpId);
  const described: Described = {
    id: fieldId,
    'aria-invalid': error ? true : undefined,
    'aria-describedby': describedBy === '' ? undefined : describedBy,
  };
  return (
    <div className={className}>
      <label className="field-label" htmlFor={fieldId}>
        {label}
      </label>
      {children(described, joinClasses('field-box', Boolean(error) && 'is-wrong'))}
      {error ? <FieldError id={errorId}>{error}</FieldError> : null}
      {help ? (
        <p id={helpId} className="field-help">
          {help}
        </p>
      ) : null}
    </div>
  );
}
