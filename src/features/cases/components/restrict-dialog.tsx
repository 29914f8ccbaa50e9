import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { usePerson } from '#src/http/session.ts';
import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { caseChoices } from '../api.ts';
import type { ActDialogProps } from './act-dialog.ts';

/** Asks who of the laboratory may know of the case at all. */
export function RestrictDialog({ view, error, sending, onSend, onLeave }: ActDialogProps) {
  const person = usePerson();
  const { data: choices } = useQuery(caseChoices);
  const [named, setNamed] = useState<readonly string[]>(view.namedPeople.map(({ id }) => id));
  const always = [person.id, view.assignedTo?.id];
  const send = (restricted: boolean) =>
    onSend({
      method: 'PUT',
      path: '/restriction',
      body: { restricted, namedPersonIds: restricted ? named : [], versionSeen: view.version },
    });
  const turn = (id: string) => setNamed(named.includes(id) ? named.filter((each) => each !== id) : [...named, id]);
  return (
    <Dialog
      open
      onOpenChange={onLeave}
      title={`Restrict who sees ${view.number}`}
      description="To all others of the laboratory the case is not there: no number, no count, no search hit. Its requester goes on seeing its state."
    >
      <fieldset className="mt-3 grid max-h-[40vh] gap-1 overflow-y-auto p-1">
        <legend className="field-label">Who sees it</legend>
        {choices?.staff.map(({ id, name }) => (
          <CheckField
            key={id}
            label={id === view.assignedTo?.id ? `${name}, who holds it` : name}
            checked={always.includes(id) || named.includes(id)}
            disabled={always.includes(id)}
            onChange={() => turn(id)}
          />
        ))}
      </fieldset>
      {error ? <FieldError id="restrict-error">{error}</FieldError> : null}
      <div className="acts mt-4">
        <Button kind="main" disabled={sending} onClick={() => send(true)}>
          Restrict the case
        </Button>
        {view.restricted ? (
          <Button disabled={sending} onClick={() => send(false)}>
            Show it to all staff
          </Button>
        ) : null}
        <Button onClick={onLeave}>Leave it as it is</Button>
      </div>
    </Dialog>
  );
}
