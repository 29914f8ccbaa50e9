import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { ReviewActs } from '../api.ts';
import { RefusalNote } from './refusal-note.tsx';

type AcceptNoteFormProps = { note: string; act: ReviewActs['acceptNote']; onLeave: () => void };

/** A manager lets one note stand, and says why. */
export function AcceptNoteForm({ note, act, onLeave }: AcceptNoteFormProps) {
  const [reason, setReason] = useState('');
  return (
    <form
      noValidate
      className="mt-2 flex flex-col gap-3 pl-[26px]"
      onSubmit={(event) => {
        event.preventDefault();
        if (reason.trim() !== '') act.mutate({ note, reason: reason.trim() });
      }}
    >
      <TextField label="Why it may stand" value={reason} onChange={(event) => setReason(event.target.value)} />
      <RefusalNote error={act.error} />
      <div className="acts">
        <Button
          type="submit"
          small
          disabled={act.isPending}
          closedBecause={reason.trim() === '' ? 'Opens once a reason stands above.' : undefined}
        >
          Let the note stand
        </Button>
        <Button small kind="plain" onClick={onLeave}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
