import { useSyncExternalStore } from 'react';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { sendFile } from './send-file.ts';

/** One file on its way in. */
export type Arrival = {
  readonly id: string;
  readonly file: File;
  readonly state: 'waiting' | 'coming in' | 'here' | 'failed';
  readonly sentBytes: number;
  /** When it began, ms of the page's own clock. */
  readonly begunAt: number | null;
  readonly failure: string | null;
  readonly figure: FractographView | null;
};

// More at once would only share the same line, and each takes a connection of the browser's few.
const mostAtOnce = 3;

/** Files coming into one case. It outlives the page that began it, so that one may leave the page meanwhile. */
export class Arrivals {
  readonly #number: string;
  #list: readonly Arrival[] = [];
  readonly #listeners = new Set<() => void>();
  readonly #onHere: () => void;

  constructor(number: string, onHere: () => void) {
    this.#number = number;
    this.#onHere = onHere;
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly list = (): readonly Arrival[] => this.#list;

  bringIn(files: readonly File[]): void {
    const waiting = { state: 'waiting', sentBytes: 0, begunAt: null, failure: null, figure: null } as const;
    // Those that are here already make room; those that failed stay until a person settles them.
    const open = this.#list.filter(({ state }) => state !== 'here');
    const keep = open.some(({ state }) => state !== 'failed') ? this.#list : open;
    this.#set([...keep, ...files.map((file) => ({ ...waiting, id: crypto.randomUUID(), file }))]);
    this.#next();
  }

  /** Tries a failed one again, from its beginning. */
  again(id: string): void {
    this.#change(id, { state: 'waiting', sentBytes: 0, begunAt: null, failure: null });
    this.#next();
  }

  leaveOut(id: string): void {
    this.#set(this.#list.filter((each) => each.id !== id));
  }

  #next(): void {
    const running = this.#list.filter(({ state }) => state === 'coming in').length;
    const waiting = this.#list.filter(({ state }) => state === 'waiting').slice(0, Math.max(0, mostAtOnce - running));
    for (const arrival of waiting) void this.#send(arrival);
  }

  async #send({ id, file }: Arrival): Promise<void> {
    this.#change(id, { state: 'coming in', begunAt: performance.now() });
    const onSent = (sentBytes: number) => this.#change(id, { sentBytes });
    const outcome = await sendFile(`/api/cases/${this.#number}/fractographs`, file, onSent);
    if (outcome.kind === 'here') this.#change(id, { state: 'here', sentBytes: file.size, figure: outcome.figure });
    else this.#change(id, { state: 'failed', failure: outcome.why });
    this.#onHere();
    this.#next();
  }

  #change(id: string, change: Partial<Arrival>): void {
    this.#set(this.#list.map((each) => (each.id === id ? { ...each, ...change } : each)));
  }

  #set(list: readonly Arrival[]): void {
    this.#list = list;
    for (const listener of this.#listeners) listener();
  }
}

const ofCase = new Map<string, Arrivals>();

/** The files coming into a case; `onHere` is told after each that came or failed. */
export function arrivalsOf(number: string, onHere: () => void): Arrivals {
  const known = ofCase.get(number);
  if (known) return known;
  const made = new Arrivals(number, onHere);
  ofCase.set(number, made);
  return made;
}

export function useArrivals(arrivals: Arrivals): readonly Arrival[] {
  return useSyncExternalStore(arrivals.subscribe, arrivals.list);
}
