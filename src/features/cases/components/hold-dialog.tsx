import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { ActDialogProps } from './act-dialog.ts';

/** Asks for what the case waits and until when. */
export function HoldDialog({ view, error, sending, onSend, onLeave }: ActDialogProps) {
  const [reason, setReason] = useState('');
  const [until, setUntil] = useState('');
  const body = { reason, until, versionSeen: view.version };
  return (
    <Dialog
      open
      onOpenChange={onLeave}
      title={`Put ${view.number} on hold`}
      description="Nothing in it changes while it is on hold; it goes on from where it is."
    >
      <form
        onSubmit={(event) => {
          event.preventDefault();
          onSend({ method: 'PUT', path: '/hold', body });
        }}
      >
        <TextField
          label="What it waits for"
          required
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          className="mt-3"
        />
        <TextField
          label="Until"
          type="date"
          required
          value={until}
          onChange={(event) => setUntil(event.target.value)}
          className="mt-3"
        />
        {error ? <FieldError id="hold-error">{error}</FieldError> : null}
        <div className="acts mt-4">
          <Button type="submit" kind="main" disabled={sending}>
            Put it on hold
          </Button>
          <Button onClick={onLeave}>Leave it open</Button>
        </div>
      </form>
    </Dialog>
  );
}
