import { WarningIcon } from '@phosphor-icons/react/dist/csr/Warning';
import type { ReactNode } from 'react';

/** What is wrong, with which field, and what would be right. Stands between the field and its help. */
export function FieldError({ id, children }: { id: string; children: ReactNode }) {
  return (
    <p id={id} className="field-error" role="alert">
      <WarningIcon size={15} aria-hidden />
      <span>{children}</span>
    </p>
  );
}
