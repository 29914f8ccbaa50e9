import * as Y from 'yjs';

/**
 * Whether a state of the shared text (a Yjs snapshot, as the server tells it) holds everything on this page: every run
 * that was written and every one that was struck out. Only then may the page say that it is kept.
 */
export function coversText(snapshot: Uint8Array, text: Y.Doc): boolean {
  const kept = Y.decodeSnapshot(snapshot);
  const own = Y.snapshot(text);
  for (const [client, clock] of own.sv) if ((kept.sv.get(client) ?? 0) < clock) return false;
  for (const [client, struck] of own.ds.clients) {
    const known = kept.ds.clients.get(client) ?? [];
    if (!struck.every((run) => isWithin(run, known))) return false;
  }
  return true;
}

type Run = { readonly clock: number; readonly len: number };

function isWithin(run: Run, known: readonly Run[]): boolean {
  return known.some((each) => each.clock <= run.clock && each.clock + each.len >= run.clock + run.len);
}
