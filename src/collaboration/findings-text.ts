import { HocuspocusProvider, HocuspocusProviderWebsocket } from '@hocuspocus/provider';
import * as Y from 'yjs';
import { FindingsNews } from '#shared/contracts/findings.ts';
import { coversText } from './findings-covers.ts';

// The shared text of one case on this page: what is typed is sent at once, stays here while the laboratory cannot be
// reached, and is said to be kept only once the server has said so of everything that stands here.

export type PersonWriting = {
  readonly clientId: number;
  readonly isSelf: boolean;
  readonly personId: string;
  readonly name: string;
  readonly mayWrite: boolean;
  /** Number of the part where the caret is; null for who only reads. */
  readonly part: number | null;
};

export type FindingsState = {
  /** Whether the text has been here once; until then nothing is shown as if it were empty. */
  readonly isThere: boolean;
  readonly isConnected: boolean;
  readonly mayWrite: boolean;
  readonly isKept: boolean;
  readonly keptAt: string | null;
  /** Why the last that was typed could not be kept, in the server's words. */
  readonly refusal: string | null;
  /** Set where there is nothing here for this person. */
  readonly nothingHere: boolean;
  readonly people: readonly PersonWriting[];
};

export type Self = { readonly id: string; readonly name: string };

const nothingHereCode = 4404;
// Six digits, as the caret asks for; the page draws carets in colours of its own.
const caretColour = '#8A3D70';

const unopened: FindingsState = {
  isThere: false,
  isConnected: false,
  mayWrite: false,
  isKept: true,
  keptAt: null,
  refusal: null,
  nothingHere: false,
  people: [],
};

export class FindingsText {
  readonly doc = new Y.Doc();
  readonly provider: HocuspocusProvider;
  readonly user: { name: string; color: string; id: string };
  readonly #socket: HocuspocusProviderWebsocket;
  readonly #listeners = new Set<() => void>();
  readonly #caseListeners = new Set<() => void>();
  #state = unopened;
  #keptSnapshot: Uint8Array | null = null;
  #looking: ReturnType<typeof setTimeout> | undefined;

  constructor(number: string, self: Self) {
    this.user = { name: self.name, color: caretColour, id: self.id };
    const scheme = window.location.protocol === 'https:' ? 'wss' : 'ws';
    this.#socket = new HocuspocusProviderWebsocket({
      url: `${scheme}://${window.location.host}/sockets/findings`,
      delay: 500,
      minDelay: 250,
      maxDelay: 5000,
    });
    this.provider = new HocuspocusProvider({
      websocketProvider: this.#socket,
      name: number,
      document: this.doc,
      onSynced: () => this.#set({ isThere: true, isConnected: true }),
      onAuthenticated: ({ scope }) => this.#authenticated(scope !== 'readonly'),
      onClose: ({ event }) => this.#closed(event.code),
      onStateless: ({ payload }) => this.#hear(FindingsNews.parse(JSON.parse(payload))),
      onAwarenessChange: () => this.#set({ people: this.#people() }),
    });
    this.provider.attach();
    this.doc.on('update', this.#lookSoon);
    window.addEventListener('beforeunload', this.#askBeforeLeaving);
  }

  readonly subscribe = (tell: () => void): (() => void) => {
    this.#listeners.add(tell);
    return () => this.#listeners.delete(tell);
  };
  readonly state = (): FindingsState => this.#state;

  /** Tells when something else in the case was done. */
  readonly hearCase = (tell: () => void): (() => void) => {
    this.#caseListeners.add(tell);
    return () => this.#caseListeners.delete(tell);
  };

  /** Says in which part the caret of this person is. */
  at(part: number | null): void {
    this.provider.setAwarenessField('part', part);
  }

  destroy(): void {
    clearTimeout(this.#looking);
    window.removeEventListener('beforeunload', this.#askBeforeLeaving);
    this.doc.off('update', this.#lookSoon);
    this.#listeners.clear();
    this.provider.destroy();
    this.#socket.destroy();
    this.doc.destroy();
  }

  #authenticated(mayWrite: boolean): void {
    this.provider.setAwarenessField('user', { ...this.user, mayWrite });
    this.#set({ mayWrite, isConnected: true, ...(mayWrite ? { refusal: null } : {}) });
  }

  #closed(code: number): void {
    this.#set({ isConnected: false, ...(code === nothingHereCode ? { nothingHere: true } : {}) });
    if (code === nothingHereCode) this.#socket.disconnect();
    this.#look();
  }

  #hear(news: FindingsNews): void {
    if (news.kind === 'kept') {
      this.#keptSnapshot = bytesOf(news.snapshot);
      this.#set({ keptAt: news.at ?? this.#state.keptAt });
      this.#look();
    } else if (news.kind === 'not kept') this.#set({ refusal: news.again ? null : news.words });
    else for (const tell of this.#caseListeners) tell();
  }

  // Comparing is dearer than typing: once for all that comes within one turn.
  readonly #lookSoon = (): void => {
    this.#looking ??= setTimeout(() => this.#look(), 60);
  };

  #look(): void {
    clearTimeout(this.#looking);
    this.#looking = undefined;
    const isKept = this.#keptSnapshot === null ? !hasOwnText(this.doc) : coversText(this.#keptSnapshot, this.doc);
    this.#set({ isKept, ...(isKept ? { refusal: null } : {}) });
  }

  readonly #askBeforeLeaving = (event: BeforeUnloadEvent): void => {
    if (!this.#state.isKept) event.preventDefault();
  };

  #people(): PersonWriting[] {
    const states = this.provider.awareness?.getStates() ?? new Map<number, Record<string, unknown>>();
    return [...states].flatMap(([clientId, state]): PersonWriting[] => {
      const user: unknown = state.user;
      if (!isUser(user)) return [];
      const part = typeof state.part === 'number' ? state.part : null;
      const isSelf = clientId === this.doc.clientID;
      return [{ clientId, isSelf, personId: user.id, name: user.name, mayWrite: user.mayWrite === true, part }];
    });
  }

  #set(change: Partial<FindingsState>): void {
    const next = { ...this.#state, ...change };
    if (JSON.stringify(next) === JSON.stringify(this.#state)) return;
    this.#state = next;
    for (const tell of this.#listeners) tell();
  }
}

function isUser(user: unknown): user is { id: string; name: string; mayWrite?: boolean } {
  return (
    typeof user === 'object' &&
    user !== null &&
    'id' in user &&
    typeof user.id === 'string' &&
    'name' in user &&
    typeof user.name === 'string'
  );
}

function hasOwnText(doc: Y.Doc): boolean {
  return (Y.snapshot(doc).sv.get(doc.clientID) ?? 0) > 0;
}

function bytesOf(base64: string): Uint8Array {
  return Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0));
}
