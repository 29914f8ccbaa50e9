import pg from 'pg';
import type { Logger } from 'pino';

const tries = 8;
const betweenTriesMs = 250;

/**
 * Sees to it that a text is open in one server process at a time: a lock of the database's session on a connection of
 * its own, which goes with the process however it ends. Another process that is asked for the same text refuses with
 * "try again" (1013), until a balancer sends its people to the owner.
 */
export class FindingsOwner {
  readonly #url: string;
  readonly #log: Logger;
  readonly #onLost: () => void;
  readonly #held = new Set<string>();
  #client: pg.Client | null = null;
  #turn: Promise<unknown> = Promise.resolve();

  constructor(url: string, log: Logger, onLost: () => void) {
    this.#url = url;
    this.#log = log;
    this.#onLost = onLost;
  }

  /** Takes the text, waiting a moment for a process that is just going down. @returns whether it is ours now */
  async take(caseId: string): Promise<boolean> {
    for (let attempt = 1; ; attempt += 1) {
      if (await this.#inTurn(() => this.#try(caseId))) return true;
      if (attempt === tries) return false;
      await new Promise((done) => setTimeout(done, betweenTriesMs));
    }
  }

  /** Gives the text back, unless it is open again by the time its turn comes. */
  async giveBack(caseId: string, isOpen: () => boolean): Promise<void> {
    await this.#inTurn(async () => {
      if (isOpen() || !this.#held.delete(caseId)) return;
      await this.#client?.query('select pg_advisory_unlock(hashtextextended($1, 0))', [keyOf(caseId)]);
    }).catch((error: unknown) => this.#log.warn({ err: error }, 'a text was not given back'));
  }

  async stop(): Promise<void> {
    await this.#turn.catch(() => undefined);
    const client = this.#client;
    this.#client = null;
    client?.removeAllListeners();
    client?.on('error', () => undefined);
    await client?.end().catch(() => undefined);
  }

  #inTurn<Done>(work: () => Promise<Done>): Promise<Done> {
    const done = this.#turn.then(work, work);
    this.#turn = done.catch(() => undefined);
    return done;
  }

  async #try(caseId: string): Promise<boolean> {
    if (this.#held.has(caseId)) return true;
    const client = await this.#connected();
    const { rows } = await client.query<{ taken: boolean }>(
      'select pg_try_advisory_lock(hashtextextended($1, 0)) as taken',
      [keyOf(caseId)],
    );
    const taken = rows[0]?.taken === true;
    if (taken) this.#held.add(caseId);
    return taken;
  }

  async #connected(): Promise<pg.Client> {
    if (this.#client) return this.#client;
    const client = new pg.Client({ connectionString: this.#url, keepAlive: true });
    const lost = () => {
      if (this.#client !== client) return;
      this.#client = null;
      this.#held.clear();
      this.#onLost();
    };
    client.on('error', lost);
    client.on('end', lost);
    await client.connect();
    this.#client = client;
    return client;
  }
}

const keyOf = (caseId: string) => `findings of ${caseId}`;
