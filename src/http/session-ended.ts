import { useSyncExternalStore } from 'react';

type Waiting = (isSignedIn: boolean) => void;

let waiting: readonly Waiting[] = [];
const listeners = new Set<() => void>();

const tell = () => listeners.forEach((hear) => hear());

/**
 * For a request that found the session ended: waits until the person has signed in again over the page. False when they
 * would not, or when no page stands behind the sign-in that could ask them.
 */
export function waitForSignIn(): Promise<boolean> {
  if (listeners.size === 0) return Promise.resolve(false);
  return new Promise((done) => {
    waiting = [...waiting, done];
    tell();
  });
}

function settle(isSignedIn: boolean): void {
  const settled = waiting;
  waiting = [];
  settled.forEach((done) => done(isSignedIn));
  tell();
}

function listen(hear: () => void): () => void {
  listeners.add(hear);
  return () => listeners.delete(hear);
}

const goOn = () => settle(true);
const giveUp = () => settle(false);

/** Whether requests wait for the sign-in, and how to let them go on or give up. */
export function useSessionEnded(): { ended: boolean; goOn: () => void; giveUp: () => void } {
  const ended = useSyncExternalStore(listen, () => waiting.length > 0);
  return { ended, goOn, giveUp };
}
