import { useEffect, useState, useSyncExternalStore } from 'react';
import { FindingsText, type FindingsState, type Self } from './findings-text.ts';

// Texts that are open on this page. One that is left with something not kept stays, and goes once it is kept.
const open = new Map<string, { text: FindingsText; users: number }>();

function take(number: string, self: Self): FindingsText {
  const found = open.get(keyOf(number, self));
  if (found) return found.text;
  const text = new FindingsText(number, self);
  open.set(keyOf(number, self), { text, users: 0 });
  return text;
}

const keyOf = (number: string, self: Self) => `${number} ${self.id}`;

function use(number: string, self: Self): () => void {
  const entry = open.get(keyOf(number, self));
  if (!entry) return () => undefined;
  entry.users += 1;
  return () => {
    entry.users -= 1;
    // A page that is drawn twice at its opening comes back before this is looked at.
    setTimeout(() => leaveWhenKept(keyOf(number, self)), 0);
  };
}

function leaveWhenKept(key: string): void {
  const entry = open.get(key);
  if (!entry || entry.users > 0) return;
  if (!entry.text.state().isKept) {
    setTimeout(() => leaveWhenKept(key), 1000);
    return;
  }
  open.delete(key);
  entry.text.destroy();
}

/** The shared text of a case, open while the part that calls it is shown; drawn anew for another case. */
export function useFindingsText(number: string, self: Self): { text: FindingsText; state: FindingsState } {
  const [text] = useState(() => take(number, self));
  useEffect(() => use(number, self), [number, self]);
  const state = useSyncExternalStore(text.subscribe, text.state);
  return { text, state };
}
