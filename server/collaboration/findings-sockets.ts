import { Hocuspocus, type Document } from '@hocuspocus/server';
import type { Logger } from 'pino';
import { WebSocketServer, type WebSocket } from 'ws';
import * as Y from 'yjs';
import { z } from 'zod';
import type { FindingsNews } from '#shared/contracts/findings.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import type { Person } from '#shared/contracts/people.ts';
import { may } from '#shared/rules/may.ts';
import { visitorContext, type ContextParts } from '../http/context.ts';
import type { UpgradeHandler } from '../http/upgrades.ts';
import { factsOf, findSeenCase } from '../rights/open-case.ts';
import { FindingsKeeper, whyNotKept } from './findings-keeper.ts';
import { FindingsOwner } from './findings-owner.ts';
import { FindingsQueue } from './findings-queue.ts';
import { ensureOutline, loadFindings } from './findings-rows.ts';
import { listen } from './listen.ts';

// The shared text of a case, at /sockets/findings; the name of a document is the number of its case. An update is told
// as kept only once its row is committed. What the database refuses is answered in words, and the text is read afresh
// from the database, so that the memory of this process is never ahead of it for long: whoever wrote still has it on
// the page, and the page sends what is missing when it comes back.

const closings = {
  again: { code: 1013, reason: 'try again' },
  readAfresh: { code: 4205, reason: 'read afresh' },
  nothingHere: { code: 4404, reason: 'nothing here' },
  signedOut: { code: 4401, reason: 'signed out' },
} as const;
type Closing = (typeof closings)[keyof typeof closings];

// The longest update: a page pasted in whole, with room.
const largestMessageBytes = 8 * 1024 * 1024;
// A page that does not answer the closing of its socket is cut off.
const cutOffAfterMs = 1000;

const CaseNews = z.object({ number: z.string(), act: z.string() });
const PersonNews = z.object({ id: z.string() });

/** What goes with a socket from its opening on. */
type Opened = { readonly person: Person; readonly socket: WebSocket };
type OpenText = {
  readonly document: Document;
  readonly queue: FindingsQueue;
  readonly caseId: string;
  keptAt: Date | null;
};

/** A refusal that the page is told by its reason; as it has no message, the library writes nothing to the console. */
class Refused extends Error {
  readonly reason: string;
  constructor({ reason }: Closing) {
    super('');
    this.reason = reason;
  }
}

/** The sockets of the findings, and how they are all closed once everything written is kept. */
export async function openFindingsSockets(parts: ContextParts, settings: { databaseUrl: string }, log: Logger) {
  const findings = new FindingsSockets(parts, settings, log);
  const listening = await listen(
    settings.databaseUrl,
    {
      hb_case: (payload) => findings.hearAct(CaseNews.parse(JSON.parse(payload))),
      hb_person: (payload) => findings.closePerson(PersonNews.parse(JSON.parse(payload)).id),
    },
    { log, onOpen: () => findings.readAllAfresh() },
  );
  const stop = async () => {
    await findings.stop();
    await listening.stop();
  };
  return { handle: findings.handle, stop };
}

class FindingsSockets {
  readonly #parts: ContextParts;
  readonly #log: Logger;
  readonly #server = new WebSocketServer({ noServer: true, maxPayload: largestMessageBytes });
  readonly #hocuspocus: Hocuspocus;
  readonly #keeper: FindingsKeeper;
  readonly #owner: FindingsOwner;
  readonly #texts = new Map<string, OpenText>();
  readonly #people = new Map<WebSocket, string>();

  constructor(parts: ContextParts, settings: { databaseUrl: string }, log: Logger) {
    this.#parts = parts;
    this.#log = log;
    this.#keeper = new FindingsKeeper(parts);
    this.#owner = new FindingsOwner(settings.databaseUrl, log, () => this.readAllAfresh());
    this.#hocuspocus = new Hocuspocus({
      quiet: true,
      // Nothing is stored of the text as a whole: each update is, as it comes.
      debounce: 0,
      maxDebounce: 0,
      onAuthenticate: async ({ context, documentName, connectionConfig }) => {
        const readOnly = await this.#orLeave(context, () => this.#admit(context, documentName));
        connectionConfig.readOnly = readOnly;
      },
      onLoadDocument: ({ context, documentName, document }) =>
        this.#orLeave(context, () => this.#load(context, documentName, document)),
      connected: async ({ documentName, connection }) => {
        const text = this.#texts.get(documentName);
        if (!text?.queue.isIdle) return;
        const news = keptNews(text, Y.encodeSnapshot(Y.snapshot(text.document)));
        connection.sendStateless(JSON.stringify(news));
      },
      beforeUnloadDocument: async ({ documentName, document }) => {
        // One that was put aside must not take with it the text that was opened after it.
        if (this.#hocuspocus.documents.get(documentName) !== document) throw new Refused(closings.readAfresh);
      },
      afterUnloadDocument: ({ documentName }) => this.#giveBack(documentName),
    });
  }

  readonly handle: UpgradeHandler = (request, socket, head, person) => {
    this.#server.handleUpgrade(request, socket, head, (opened) => {
      this.#people.set(opened, person.id);
      opened.on('error', () => opened.terminate());
      opened.on('close', () => this.#people.delete(opened));
      const context: Opened = { person, socket: opened };
      this.#hocuspocus.handleConnection(opened, request, context);
    });
  };

  /** A state or a wall may have changed: everyone comes back with the right they have now. */
  hearAct({ number, act }: { number: string; act: string }): void {
    if (/^(case|review|amendment)\./.test(act)) this.#putAside(number, { kind: 'case changed' });
    else if (act !== 'findings.written') this.#tell(number, { kind: 'case changed' });
  }

  closePerson(id: string): void {
    for (const [socket, personId] of this.#people) if (personId === id) leave(socket, closings.signedOut);
  }

  /** News, or the ownership of the texts, was lost for a while: nobody goes on writing on what held before. */
  readAllAfresh(): void {
    for (const number of [...this.#texts.keys()]) this.#putAside(number, { kind: 'case changed' });
  }

  async stop(): Promise<void> {
    const texts = [...this.#texts.values()];
    this.#hocuspocus.closeConnections();
    await Promise.all(texts.map(({ queue }) => queue.idle()));
    for (const socket of this.#server.clients) socket.terminate();
    this.#server.close();
    await this.#owner.stop();
  }

  /** What goes wrong leaves the page to try again, rather than with a socket that nobody answers on. */
  async #orLeave<Done>({ socket }: Opened, work: () => Promise<Done>): Promise<Done> {
    try {
      return await work();
    } catch (error) {
      if (error instanceof Refused) throw error;
      this.#log.error({ err: error }, 'the findings of a case could not be opened');
      return leaveAnd(socket, closings.again);
    }
  }

  /** @returns whether the person only reads. @throws Refused in the same words for what is not there and not theirs */
  async #admit({ person, socket }: Opened, documentName: string): Promise<boolean> {
    const row = await this.#findCase(person, documentName);
    if (!row || !may(person, 'read', factsOf(row)).allowed) return leaveAnd(socket, closings.nothingHere);
    if (!(await this.#owner.take(row.id))) return leaveAnd(socket, closings.again);
    return !may(person, 'write findings', factsOf(row)).allowed;
  }

  async #findCase(person: Person, documentName: string) {
    const number = CaseNumber.safeParse(documentName);
    return number.success ? findSeenCase({ db: this.#parts.database.db }, person, number.data) : null;
  }

  async #load({ person, socket }: Opened, number: string, document: Document): Promise<void> {
    const row = await this.#findCase(person, number);
    if (!row) return leaveAnd(socket, closings.nothingHere);
    // What was written before the text was last closed is in the database first.
    await this.#texts.get(number)?.queue.idle();
    if (!(await this.#owner.take(row.id))) return leaveAnd(socket, closings.again);
    await visitorContext(this.#parts).besideAct((tx) => ensureOutline(tx, row.id));
    const { text, keptAt } = await loadFindings({ db: this.#parts.database.db }, row.id);
    Y.applyUpdate(document, Y.encodeStateAsUpdate(text));
    this.#keepFrom(CaseNumber.parse(number), document, { caseId: row.id, keptAt });
  }

  #keepFrom(number: CaseNumber, document: Document, known: { caseId: string; keptAt: Date | null }): void {
    const queue = new FindingsQueue(document, {
      keep: (written) => this.#keeper.keep(number, written),
      onKept: (at, snapshot) => {
        text.keptAt = at;
        if (this.#texts.get(number) === text) this.#tell(number, keptNews(text, snapshot));
      },
      onFailed: (error) => {
        const why = whyNotKept(error);
        // The cause alone: the failed query has the text itself in it.
        const cause = error instanceof Error && error.cause ? error.cause : error;
        if (why.kind === 'not kept' && why.again) this.#log.error({ err: cause }, 'findings were not kept');
        if (this.#texts.get(number) === text) this.#putAside(number, why);
      },
    });
    const text: OpenText = { document, queue, ...known };
    document.on('update', (update: Uint8Array, origin: { context?: Opened } | null) => {
      const person = origin?.context?.person;
      if (person) queue.add({ update, person });
    });
    this.#texts.set(number, text);
  }

  /** Takes a text out of memory as it stands; its people come back at once and bring what is not kept yet. */
  #putAside(number: string, why: FindingsNews): void {
    const text = this.#texts.get(number);
    if (!text || this.#hocuspocus.documents.get(number) !== text.document) return;
    for (const connection of text.document.getConnections()) {
      connection.sendStateless(JSON.stringify(why));
      connection.close(closings.readAfresh);
      leave(connection.webSocket, closings.readAfresh);
    }
    this.#hocuspocus.documents.delete(number);
    void this.#giveBack(number);
  }

  #tell(number: string, news: FindingsNews): void {
    this.#texts.get(number)?.document.broadcastStateless(JSON.stringify(news));
  }

  async #giveBack(number: string): Promise<void> {
    const text = this.#texts.get(number);
    if (!text) return;
    await text.queue.idle();
    const isOpen = () => this.#hocuspocus.documents.has(number) || this.#hocuspocus.loadingDocuments.has(number);
    if (isOpen()) return;
    this.#texts.delete(number);
    await this.#owner.giveBack(text.caseId, isOpen);
  }
}

function keptNews({ keptAt }: OpenText, snapshot: Uint8Array): FindingsNews {
  return { kind: 'kept', at: keptAt?.toISOString() ?? null, snapshot: Buffer.from(snapshot).toString('base64') };
}

function leave(socket: WebSocket, { code, reason }: Closing): void {
  socket.close(code, reason);
  setTimeout(() => socket.terminate(), cutOffAfterMs).unref();
}

/** Leaves once the reason of the refusal has been sent. @throws Refused, always */
function leaveAnd(socket: WebSocket, closing: Closing): never {
  setImmediate(() => leave(socket, closing));
  throw new Refused(closing);
}
