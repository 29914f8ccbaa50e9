import { randomUUID } from 'node:crypto';
import type { Logger } from 'pino';
import { WebSocketServer, type WebSocket } from 'ws';
import { z } from 'zod';
import { CaseNumber } from '#shared/contracts/ids.ts';
import { LiveWord, type LiveNews } from '#shared/contracts/live.ts';
import type { Person } from '#shared/contracts/people.ts';
import { may } from '#shared/rules/may.ts';
import type { ContextParts } from '../http/context.ts';
import type { UpgradeHandler } from '../http/upgrades.ts';
import { factsOf, findSeenCase } from '../rights/open-case.ts';
import { listen } from './listen.ts';
import { onceEach, Presence, PresenceElsewhere } from './presence.ts';

// Live events: who has a case open hears at once that something in it was done, and who else is there.

const beatMs = 20_000;
const closedToYou = 4403;
const signedOut = 4401;

const CaseNews = z.object({
  number: z.string(),
  act: z.string(),
  objectId: z.string().nullable(),
  by: z.string().nullable(),
});
const PersonNews = z.object({ id: z.string() });

type Listener = { socket: WebSocket; person: Person; number: string; place: string; alive: boolean };

/** The sockets of open cases at `/sockets/live/:number`, and how they are all closed. */
export async function openCaseEvents(parts: ContextParts, settings: { databaseUrl: string }, log: Logger) {
  const events = new CaseEvents(parts);
  const listening = await listen(
    settings.databaseUrl,
    {
      hb_case: (payload) => read(CaseNews, payload, (news) => events.hearAct(news)),
      hb_presence: (payload) => read(Presence, payload, (presence) => events.hearPresence(presence)),
      hb_person: (payload) => read(PersonNews, payload, ({ id }) => events.closePerson(id)),
    },
    { log, onOpen: () => events.catchUp() },
  );
  events.tell = (presence) => void listening.notify('hb_presence', JSON.stringify(presence));
  const beat = setInterval(() => events.beat(), beatMs);
  const stop = async () => {
    clearInterval(beat);
    events.stop();
    await listening.stop();
  };
  return { handle: events.handle, stop };
}

function read<Schema extends z.ZodType>(schema: Schema, payload: string, hear: (news: z.output<Schema>) => void) {
  const parsed = schema.safeParse(jsonOf(payload));
  if (parsed.success) hear(parsed.data);
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

class CaseEvents {
  readonly #parts: ContextParts;
  readonly #process = randomUUID();
  readonly #server = new WebSocketServer({ noServer: true, maxPayload: 2048 });
  readonly #listeners = new Set<Listener>();
  readonly #elsewhere = new PresenceElsewhere();
  tell: (presence: Presence) => void = () => undefined;

  constructor(parts: ContextParts) {
    this.#parts = parts;
  }

  /** Lets staff who see the case listen; to all others the case is not there. */
  readonly handle: UpgradeHandler = (request, socket, head, person) => {
    const number = new URL(request.url ?? '/', 'http://here').pathname.split('/')[3] ?? '';
    this.#mayListen(person, number).then(
      (allowed) => {
        if (!allowed) socket.end('HTTP/1.1 404 Not Found\r\nConnection: close\r\nContent-Length: 0\r\n\r\n');
        else this.#server.handleUpgrade(request, socket, head, (opened) => this.#admit(opened, person, number));
      },
      () => socket.destroy(),
    );
  };

  hearAct(news: z.infer<typeof CaseNews>): void {
    const { number, act, objectId, by } = news;
    this.#send(number, { kind: 'act', act, objectId, by });
    // A wall may just have gone up round the case.
    if (act.startsWith('case.')) void this.#askAgain(number);
  }

  hearPresence(presence: Presence): void {
    if (presence.process === this.#process) return;
    const isNew = !this.#elsewhere.peopleIn(presence.number).length && presence.people.length > 0;
    this.#elsewhere.hear(presence);
    this.#sayWhoIsHere(presence.number);
    // A process that has just come to this case does not know yet who is here.
    if (isNew && this.#hereIn(presence.number).length > 0) this.#tellOthers(presence.number);
  }

  closePerson(id: string): void {
    for (const listener of this.#listeners) if (listener.person.id === id) listener.socket.close(signedOut);
  }

  /** After the database's news was lost for a while, pages fetch everything again. */
  catchUp(): void {
    for (const number of this.#numbers()) {
      this.#send(number, { kind: 'missed some' });
      this.#tellOthers(number);
    }
  }

  /** Ends sockets that answer no more, and tells other processes who is still here. */
  beat(): void {
    for (const listener of this.#listeners) {
      if (!listener.alive) listener.socket.terminate();
      listener.alive = false;
      listener.socket.ping();
    }
    for (const number of this.#elsewhere.beat()) this.#sayWhoIsHere(number);
    for (const number of this.#numbers()) this.#tellOthers(number);
  }

  stop(): void {
    for (const { socket } of this.#listeners) socket.terminate();
    this.#server.close();
  }

  #admit(socket: WebSocket, person: Person, number: string): void {
    const listener: Listener = { socket, person, number, place: '', alive: true };
    this.#listeners.add(listener);
    socket.on('error', () => socket.terminate());
    socket.on('pong', () => (listener.alive = true));
    socket.on('message', (bytes, isBinary) => {
      const word = LiveWord.safeParse(isBinary ? null : jsonOf(String(bytes)));
      if (!word.success) return;
      listener.place = word.data.place;
      this.#presenceChanged(number);
    });
    socket.on('close', () => {
      this.#listeners.delete(listener);
      this.#presenceChanged(number);
    });
    this.#presenceChanged(number);
  }

  async #mayListen(person: Person, number: string): Promise<boolean> {
    const known = CaseNumber.safeParse(number);
    if (!known.success) return false;
    const row = await findSeenCase({ db: this.#parts.database.db }, person, known.data);
    return row !== null && may(person, 'read', factsOf(row)).allowed;
  }

  async #askAgain(number: string): Promise<void> {
    for (const listener of [...this.#listeners].filter((each) => each.number === number)) {
      const allowed = await this.#mayListen(listener.person, number).catch(() => true);
      if (!allowed) listener.socket.close(closedToYou);
    }
  }

  #numbers = () => new Set([...this.#listeners].map(({ number }) => number));

  #hereIn(number: string) {
    const here = [...this.#listeners].filter((listener) => listener.number === number);
    return here.map(({ person, place }) => ({ id: person.id, name: person.name, place }));
  }

  #presenceChanged(number: string): void {
    this.#sayWhoIsHere(number);
    this.#tellOthers(number);
  }

  #tellOthers(number: string): void {
    this.tell({ process: this.#process, number, people: onceEach(this.#hereIn(number)) });
  }

  #sayWhoIsHere(number: string): void {
    const people = onceEach([...this.#elsewhere.peopleIn(number), ...this.#hereIn(number)]);
    this.#send(number, { kind: 'here', people });
  }

  #send(number: string, news: LiveNews): void {
    const text = JSON.stringify(news);
    for (const { socket, number: of } of this.#listeners) {
      if (of === number && socket.readyState === socket.OPEN) socket.send(text);
    }
  }
}
