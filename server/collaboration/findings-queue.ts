import * as Y from 'yjs';
import type { Person } from '#shared/contracts/people.ts';

export type Written = { readonly update: Uint8Array; readonly person: Person };

type Keeping = {
  /** Commits what one person wrote in one go. @returns when it was kept */
  readonly keep: (written: Written) => Promise<Date>;
  /** Told after the commit, with the state of the text that it brought the database to. */
  readonly onKept: (at: Date, snapshot: Uint8Array) => void;
  /** Told once; nothing is kept of this text afterwards, since the text in memory is ahead of the database. */
  readonly onFailed: (error: unknown) => void;
};

/**
 * Keeps what is written in one open text, in the order in which it came, one commit after the other. What comes while
 * a commit is under way goes into the next, so that fast typing makes few rows.
 */
export class FindingsQueue {
  readonly #text: Y.Doc;
  readonly #keeping: Keeping;
  #waiting: Written[] = [];
  #running: Promise<void> | null = null;
  #failed = false;

  constructor(text: Y.Doc, keeping: Keeping) {
    this.#text = text;
    this.#keeping = keeping;
  }

  get isIdle(): boolean {
    return this.#running === null;
  }

  add(written: Written): void {
    if (this.#failed) return;
    this.#waiting.push(written);
    this.#running ??= this.#run();
  }

  /** Settles once nothing waits any more. */
  async idle(): Promise<void> {
    while (this.#running) await this.#running;
  }

  async #run(): Promise<void> {
    try {
      // One turn later, what came in with the same message is there too.
      await Promise.resolve();
      while (this.#waiting.length > 0) {
        const batch = this.#waiting;
        this.#waiting = [];
        // The text in memory is what the database will hold once this batch is in: nothing came in between.
        const snapshot = Y.encodeSnapshot(Y.snapshot(this.#text));
        let at = new Date(0);
        for (const written of byPerson(batch)) at = await this.#keeping.keep(written);
        this.#keeping.onKept(at, snapshot);
      }
    } catch (error) {
      this.#failed = true;
      this.#waiting = [];
      this.#keeping.onFailed(error);
    } finally {
      this.#running = null;
    }
  }
}

/** Neighbouring updates of one person as one. */
function byPerson(batch: readonly Written[]): Written[] {
  const runs: { person: Person; updates: Uint8Array[] }[] = [];
  for (const { update, person } of batch) {
    const last = runs.at(-1);
    if (last?.person.id === person.id) last.updates.push(update);
    else runs.push({ person, updates: [update] });
  }
  return runs.map(({ person, updates }) => ({ person, update: Y.mergeUpdates(updates) }));
}
