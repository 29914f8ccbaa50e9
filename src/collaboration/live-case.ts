import { useEffect, useSyncExternalStore } from 'react';
import { LiveNews, type LiveWord, type PersonHere } from '#shared/contracts/live.ts';
import { queryClient } from '../http/query-client.ts';

// One socket a case that is open: what others do in it is fetched at once, and who is here is known.

export type LiveCaseState = { readonly people: readonly PersonHere[]; readonly connected: boolean };

const nobody: LiveCaseState = { people: [], connected: false };
const againMs = [500, 1000, 2000, 5000, 10_000];
// Codes with which the server says that coming again is of no use.
const notForYou: readonly number[] = [4401, 4403];

/** Whether what was read under a key hangs on a case: its number stands in the key. */
function isOfCase(number: string, key: readonly unknown[]): boolean {
  return key.some((part) => part === number);
}

class LiveCase {
  readonly #number: string;
  readonly #listeners = new Set<() => void>();
  #socket: WebSocket | null = null;
  #state = nobody;
  #place = '';
  #tries = 0;
  #again: ReturnType<typeof setTimeout> | undefined;

  constructor(number: string) {
    this.#number = number;
  }

  readonly subscribe = (tell: () => void): (() => void) => {
    this.#listeners.add(tell);
    if (this.#listeners.size === 1) this.#open();
    return () => {
      this.#listeners.delete(tell);
      if (this.#listeners.size === 0) this.#close();
    };
  };
  readonly state = (): LiveCaseState => this.#state;

  at(place: string): void {
    this.#place = place;
    this.#say({ kind: 'at', place });
  }

  #open(): void {
    clearTimeout(this.#again);
    const scheme = window.location.protocol === 'https:' ? 'wss' : 'ws';
    const socket = new WebSocket(`${scheme}://${window.location.host}/sockets/live/${this.#number}`);
    this.#socket = socket;
    socket.addEventListener('open', () => {
      if (this.#tries > 0) this.#refetch();
      this.#tries = 0;
      this.#set({ ...this.#state, connected: true });
      this.#say({ kind: 'at', place: this.#place });
    });
    socket.addEventListener('message', ({ data }) => this.#hear(String(data)));
    socket.addEventListener('close', ({ code }) => {
      if (this.#socket !== socket) return;
      this.#socket = null;
      this.#set(nobody);
      if (notForYou.includes(code)) void queryClient.invalidateQueries({ queryKey: ['session'] });
      else this.#comeAgain();
    });
  }

  #comeAgain(): void {
    if (this.#listeners.size === 0) return;
    this.#again = setTimeout(() => this.#open(), againMs[Math.min(this.#tries, againMs.length - 1)]);
    this.#tries += 1;
  }

  #close(): void {
    clearTimeout(this.#again);
    const socket = this.#socket;
    this.#socket = null;
    this.#state = nobody;
    socket?.close();
  }

  #say(word: LiveWord): void {
    if (this.#socket?.readyState === WebSocket.OPEN) this.#socket.send(JSON.stringify(word));
  }

  #hear(text: string): void {
    const news = LiveNews.safeParse(jsonOf(text));
    if (!news.success) return;
    if (news.data.kind === 'here') this.#set({ people: news.data.people, connected: true });
    else this.#refetch();
  }

  #refetch(): void {
    void queryClient.invalidateQueries({ predicate: ({ queryKey }) => isOfCase(this.#number, queryKey) });
  }

  #set(state: LiveCaseState): void {
    this.#state = state;
    for (const tell of this.#listeners) tell();
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

const open = new Map<string, LiveCase>();

function liveCase(number: string): LiveCase {
  const known = open.get(number);
  if (known) return known;
  const made = new LiveCase(number);
  open.set(number, made);
  return made;
}

/**
 * Keeps a case live while the page is drawn: whatever was read under a key that holds the case's number is read again
 * when something in it was done. `place` is where in the case the person is, "fractographs/<id>".
 */
export function useLiveCase(number: string, place: string): LiveCaseState {
  const live = liveCase(number);
  useEffect(() => live.at(place), [live, place]);
  return useSyncExternalStore(live.subscribe, live.state);
}
