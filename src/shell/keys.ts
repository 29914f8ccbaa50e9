import { useEffect } from 'react';

/** What a key asks for anywhere in the book. */
export type KeyAct =
  { kind: 'find' } | { kind: 'list keys' } | { kind: 'await place' } | { kind: 'go'; letter: string };

type KeyPressed = { key: string; ctrlKey: boolean; metaKey: boolean; altKey: boolean };

/** True where single letters are typing: fields, editable text, and the bench, which has letters of its own. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (target.isContentEditable) return true;
  return target.closest('input, textarea, select, [contenteditable="true"], [role="dialog"], [data-own-keys]') !== null;
}

/** Reads one key. `awaiting` is true for a moment after G, when the next letter names a place. */
export function readKey(pressed: KeyPressed, awaiting: boolean): KeyAct | null {
  if (pressed.ctrlKey || pressed.metaKey || pressed.altKey) return null;
  if (awaiting) return /^[a-z]$/i.test(pressed.key) ? { kind: 'go', letter: pressed.key.toLowerCase() } : null;
  if (pressed.key === '/') return { kind: 'find' };
  if (pressed.key === '?') return { kind: 'list keys' };
  if (pressed.key === 'g' || pressed.key === 'G') return { kind: 'await place' };
  return null;
}

export type GlobalKeys = { onFind: () => void; onListKeys: () => void; onGo: (letter: string) => void; off?: boolean };

const patienceMs = 1500;

/** `/` finds, `?` lists the keys, `G` and a letter goes to a place. Off in fields, and where the person turned keys off. */
export function useGlobalKeys({ onFind, onListKeys, onGo, off = false }: GlobalKeys): void {
  useEffect(() => {
    if (off) return;
    let awaitingUntil = 0;
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTyping(event.target)) return;
      const act = readKey(event, event.timeStamp < awaitingUntil);
      awaitingUntil = act?.kind === 'await place' ? event.timeStamp + patienceMs : 0;
      if (!act) return;
      event.preventDefault();
      if (act.kind === 'find') onFind();
      if (act.kind === 'list keys') onListKeys();
      if (act.kind === 'go') onGo(act.letter);
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [onFind, onListKeys, onGo, off]);
}
