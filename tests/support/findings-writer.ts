import { HocuspocusProvider, HocuspocusProviderWebsocket } from '@hocuspocus/provider';
import { WebSocket } from 'ws';
import * as Y from 'yjs';
import { FindingsNews } from '#shared/contracts/findings.ts';
import { coversText } from '#src/collaboration/findings-covers.ts';
import { eventually } from './mailbox.ts';

/** A person with the findings of a case open, as the page has it. */
export class FindingsWriter {
  readonly text = new Y.Doc();
  readonly news: FindingsNews[] = [];
  readonly closings: number[] = [];
  readonly refusals: string[] = [];
  readonly #socket: HocuspocusProviderWebsocket;
  readonly provider: HocuspocusProvider;
  scope: string | undefined;

  constructor(address: string, cookie: string, number: string) {
    class WithCookie extends WebSocket {
      constructor(url: string) {
        super(url, { headers: { cookie, origin: address } });
        this.on('error', () => undefined);
      }
    }
    this.#socket = new HocuspocusProviderWebsocket({
      url: `${address.replace('http', 'ws')}/sockets/findings`,
      WebSocketPolyfill: WithCookie,
      delay: 100,
      minDelay: 50,
      maxDelay: 400,
    });
    this.provider = new HocuspocusProvider({
      websocketProvider: this.#socket,
      name: number,
      document: this.text,
      onStateless: ({ payload }) => this.news.push(FindingsNews.parse(JSON.parse(payload))),
      onClose: ({ event }) => this.closings.push(event.code),
      onAuthenticationFailed: ({ reason }) => this.refusals.push(reason),
      onAuthenticated: ({ scope }) => (this.scope = scope),
    });
    this.provider.attach();
  }

  get fragment(): Y.XmlFragment {
    return this.text.getXmlFragment('default');
  }

  get words(): string {
    return this.fragment.toString();
  }

  /** Adds a paragraph at the end. */
  write(words: string): void {
    this.text.transact(() => {
      const paragraph = new Y.XmlElement('paragraph');
      paragraph.insert(0, [new Y.XmlText(words)]);
      this.fragment.push([paragraph]);
    });
  }

  /** Whether the server has said of everything on this page that it is kept. */
  get isKept(): boolean {
    const kept = this.news.findLast((each) => each.kind === 'kept');
    return kept !== undefined && coversText(Buffer.from(kept.snapshot, 'base64'), this.text);
  }

  open(): Promise<true> {
    return eventually(async () => (this.provider.isSynced && this.scope !== undefined ? true : null), 'an open text');
  }

  kept(): Promise<true> {
    return eventually(async () => (this.isKept ? true : null), 'everything to be kept');
  }

  reads(words: string): Promise<true> {
    return eventually(async () => (this.words.includes(words) ? true : null), `"${words}" to be read`);
  }

  leave(): void {
    this.provider.destroy();
    this.#socket.destroy();
  }
}
