import type { z } from 'zod';
import { SessionView } from '#shared/contracts/people.ts';
import { ProblemBody } from '#shared/contracts/problem.ts';
import { waitForSignIn } from './session-ended.ts';

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
let personId: string | null = null;

/** Keeps the token of this session for the acts that follow, and whose session it is. */
export function keepSession(session: SessionView): SessionView {
  requestToken = session.requestToken;
  personId = session.person?.id ?? null;
  return session;
}

/** What an act sent by other means than `send` carries: a file on its way in tells how much of it is there. */
export function actHeaders(actId: string): Record<string, string> {
  return { 'x-request-token': requestToken, 'x-act-id': actId };
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

type AskOptions = { signal?: AbortSignal; actId?: string };

/** Asks, and where the session has ended asks once more after the same person has signed in again. */
async function ask<Schema extends z.ZodType>(
  method: 'GET' | Method,
  path: string,
  body: unknown,
  schema: Schema,
  options: AskOptions,
): Promise<z.output<Schema>> {
  try {
    return await askOnce(method, path, body, schema, options);
  } catch (error) {
    if (!(error instanceof Refusal) || !(await isSignedInAgain(error))) throw error;
    return askOnce(method, path, body, schema, options);
  }
}

/** After a refusal for want of a session or of its token: whether the same person is here, with a new token. */
async function isSignedInAgain({ body }: Refusal): Promise<boolean> {
  if (body.code === 'not-signed-in') return waitForSignIn();
  if (body.code !== 'forged-request') return false;
  const before = personId;
  const session = await askOnce('GET', '/session', undefined, SessionView, {});
  if (before !== null && session.person === null) return waitForSignIn();
  if (before !== null && session.person?.id !== before) {
    // Someone else has signed in in this browser; what is on this page must not be done in their name.
    window.location.assign('/');
    return false;
  }
  keepSession(session);
  return true;
}

async function askOnce<Schema extends z.ZodType>(
  method: 'GET' | Method,
  path: string,
  body: unknown,
  schema: Schema,
  options: AskOptions,
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
