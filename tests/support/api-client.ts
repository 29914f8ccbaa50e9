import { randomUUID } from 'node:crypto';

export type Answered = { status: number; body: any; headers: Headers }; // eslint-disable-line @typescript-eslint/no-explicit-any

/** A person at the routes, with the cookie and the request token that a browser would carry. */
export class ApiClient {
  readonly #address: string;
  #cookie = '';
  #token = '';

  constructor(address: string) {
    this.#address = address;
  }

  async signIn(mail: string, password: string): Promise<Answered> {
    await this.session();
    const answered = await this.post('/session', { mail, password });
    if (answered.status === 201) this.#token = answered.body.requestToken;
    return answered;
  }

  /** Asks who is signed in, and takes the token for the requests that follow. */
  async session(): Promise<Answered> {
    const answered = await this.get('/session');
    this.#token = answered.body.requestToken;
    return answered;
  }

  get cookie(): string {
    return this.#cookie;
  }

  get = (path: string) => this.ask('GET', path);
  post = (path: string, body: unknown = {}, actId?: string) => this.ask('POST', path, body, actId);
  put = (path: string, body: unknown = {}) => this.ask('PUT', path, body);
  patch = (path: string, body: unknown = {}) => this.ask('PATCH', path, body);
  delete = (path: string, body?: unknown) => this.ask('DELETE', path, body);

  /** Sends a file as one multipart field `file`, with further text fields. */
  async sendFile(
    path: string,
    file: { name: string; bytes: Uint8Array },
    fields: Record<string, string> = {},
    actId: string = randomUUID(),
  ) {
    const form = new FormData();
    for (const [name, value] of Object.entries(fields)) form.set(name, value);
    form.set('file', new Blob([new Uint8Array(file.bytes)]), file.name);
    return this.#fetch('POST', path, form, { 'x-act-id': actId });
  }

  /** What a browser signed in like this sends along, for requests made by hand. */
  headers(): Record<string, string> {
    return { cookie: this.#cookie, 'x-request-token': this.#token };
  }

  ask(method: string, path: string, body?: unknown, actId: string = randomUUID()): Promise<Answered> {
    const json = body === undefined ? undefined : JSON.stringify(body);
    return this.#fetch(method, path, json, {
      ...(json === undefined ? {} : { 'content-type': 'application/json' }),
      ...(method === 'GET' ? {} : { 'x-act-id': actId }),
    });
  }

  async #fetch(method: string, path: string, body: string | FormData | undefined, headers: Record<string, string>) {
    const response = await fetch(`${this.#address}/api${path}`, {
      method,
      body,
      headers: { ...headers, cookie: this.#cookie, 'x-request-token': this.#token },
    });
    const cookies = response.headers.getSetCookie().map((line) => line.split(';')[0]);
    if (cookies.length > 0) this.#cookie = cookies.join('; ');
    const bytes = Buffer.from(await response.arrayBuffer());
    const isJson = response.headers.get('content-type')?.includes('json');
    return { status: response.status, body: isJson ? JSON.parse(bytes.toString()) : bytes, headers: response.headers };
  }
}
