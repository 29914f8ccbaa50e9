import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { caseChoices } from '../api.ts';
import type { ActDialogProps } from './act-dialog.ts';

/** Asks to whom the case goes. */
export function GiveDialog({ view, error, sending, onSend, onLeave }: ActDialogProps) {
  const { data: choices } = useQuery(caseChoices);
  const [personId, setPersonId] = useState(view.assignedTo?.id ?? '');
  const body = { personId: personId === '' ? null : personId, versionSeen: view.version };
  return (
    <Dialog open onOpenChange={onLeave} title={`Give ${view.number} to someone`}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          onSend({ method: 'PUT', path: '/holder', body });
        }}
      >
        <SelectField
          label="Analyst"
          value={personId}
          onChange={(event) => setPersonId(event.target.value)}
          className="mt-3"
        >
          <option value="">no one yet</option>
          {choices?.analysts.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        {error ? <FieldError id="give-error">{error}</FieldError> : null}
        <div className="acts mt-4">
          <Button type="submit" kind="main" disabled={sending}>
            Give the case
          </Button>
          <Button onClick={onLeave}>Leave it where it is</Button>
        </div>
      </form>
    </Dialog>
  );
}
