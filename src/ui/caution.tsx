import { HandPalmIcon } from '@phosphor-icons/react/dist/csr/HandPalm';
import type { ReactNode } from 'react';

/** Two or three sentences of care at the step they belong to: under a rule, never in a box. */
export function Caution({ lead, children }: { lead?: ReactNode; children: ReactNode }) {
  return (
    <aside className="caution" aria-label="Caution">
      <HandPalmIcon size={18} aria-hidden />
      <p>
        {lead ? <b>{lead} </b> : null}
        {children}
      </p>
    </aside>
  );
}
