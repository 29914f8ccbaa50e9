import { Refusal } from '#src/http/api.ts';
import { Note } from '#src/ui/note.tsx';

/** What the server refused, and what still holds. */
export function RefusalNote({ error }: { error: Error | null }) {
  if (!error) return null;
  const holds = error instanceof Refusal ? error.body.stillHolds : null;
  return (
    <Note tone="iron" alert lead={error.message}>
      {holds ?? 'Nothing was lost: what you typed is still here.'}
    </Note>
  );
}
