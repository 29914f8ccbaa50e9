import type { z } from 'zod';
import { ProblemBody } from '#shared/contracts/problem.ts';

/** A refusal of the server, or of the way to it, as the page shows it. */
export class Refusal extends Error {
  readonly body: ProblemBody;
  constructor(body: ProblemBody) {
    super(body.message);
    this.name = 'Refusal';
    this.body = body;
  }
}

let requestToken = '';

/** The token of this session, taken from whoever asked for the session last. */
export function keepRequestToken(token: string): void {
  requestToken = token;
}

/** Reads from the server and checks the answer against its contract. @throws Refusal */
export function read<Schema extends z.ZodType>(
  path: string,
  schema: Schema,
  signal?: AbortSignal,
): Promise<z.output<Schema>> {
  return ask('GET', path, undefined, schema, { signal });
}

export type Method = 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/**
 * Sends one act. It carries an id of its own, so that when the answer is lost and the act is sent again it is done
 * once; an act that turns out to be done already answers null. Who keeps an act for
 * later gives it the same id at every try. @throws Refusal
 */
export async function send<Schema extends z.ZodType>(
  method: Method,
  path: string,
  body: unknown,
  schema: Schema,
  actId: string = crypto.randomUUID(),
): Promise<z.output<Schema> | null> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await ask(method, path, body, schema, { actId });
    } catch (error) {
      if (error instanceof Refusal && error.body.code === 'already-done') return null;
      if (error instanceof Refusal || attempt === 3) throw error instanceof Refusal ? error : unreachable();
      await new Promise((done) => setTimeout(done, attempt * 400));
    }
  }
}

async function ask<Schema extends z.ZodType>(
  method: 'GET' | Method,
  path: string,
  body: unknown,
  schema: Schema,
  options: { signal?: AbortSignal; actId?: string },
): Promise<z.output<Schema>> {
  const response = await fetch(`/api${path}`, {
    method,
    signal: options.signal,
    headers: {
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      ...(method === 'GET'
        ? {}
        : { 'x-request-token': requestToken, 'x-act-id': options.actId ?? crypto.randomUUID() }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  const text = await response.text();
  const json: unknown = text === '' ? null : JSON.parse(text);
  if (!response.ok) throw new Refusal(ProblemBody.safeParse(json).data ?? unreachable().body);
  return schema.parse(json);
}

function unreachable(): Refusal {
  return new Refusal({
    code: 'not-now',
    message: 'The laboratory’s server did not answer.',
    stillHolds: 'What you typed is kept on this page; try again in a moment.',
  });
}
