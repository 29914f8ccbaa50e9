import connectPgSimple from 'connect-pg-simple';
import { csrfSync } from 'csrf-sync';
import type { Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import passport from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import type { Person } from '#shared/contracts/people.ts';
import type { Database } from '../database/connection.ts';

const halfHour = 30 * 60 * 1000;

export type SessionSettings = {
  secret: string;
  /** Cookies only over https; off on plain loopback. */
  secureCookies: boolean;
  findPerson(id: string): Promise<Person | null>;
};

type Authenticator = InstanceType<typeof passport.Passport>;

// Which server's sessions a request belongs to; several servers run in one process under test.
const authenticators = new WeakMap<Request, Authenticator>();

/** Sessions kept in PostgreSQL, and who is behind each, read afresh at every request. */
export function sessionLayers(database: Database, settings: SessionSettings): RequestHandler[] {
  const Store = connectPgSimple(session);
  const authenticator = new passport.Passport();
  authenticator.serializeUser((user, done) => done(null, user.id));
  authenticator.deserializeUser((id: string, done) => {
    settings.findPerson(id).then(
      (person) => done(null, person ?? false),
      (error: unknown) => done(error),
    );
  });
  return [
    session({
      name: settings.secureCookies ? '__Host-hacklebook' : 'hacklebook',
      secret: settings.secret,
      store: new Store({ pool: database.pool, tableName: 'sessions', pruneSessionInterval: 15 * 60 }),
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie: { httpOnly: true, sameSite: 'lax', secure: settings.secureCookies, maxAge: 16 * halfHour, path: '/' },
    }),
    authenticator.session(),
    (request, _response, next) => {
      authenticators.set(request, authenticator);
      next();
    },
  ];
}

export type Tried = { mail: string; password: string };

/** Signs in with the address and password of the request's body, as `check` finds them; @throws what `check` throws */
export async function signInLocally(
  request: Request,
  response: Response,
  check: (tried: Tried) => Promise<Person>,
): Promise<Person> {
  const strategy = new LocalStrategy({ usernameField: 'mail', passwordField: 'password' }, (mail, password, done) => {
    check({ mail, password }).then(
      (person) => done(null, person),
      (error: unknown) => done(error),
    );
  });
  const person = await new Promise<Person>((done, fail) => {
    const settle = (error: unknown, found: Person | false | null | undefined) =>
      error || !found ? fail(error ?? new Error('no address and password in the request')) : done(found);
    authenticatorOf(request).authenticate(strategy, settle)(request, response, fail);
  });
  await beginSession(request, person);
  return person;
}

/** Begins a new session for the person, under a new id: one known before the sign-in opens nothing after it. */
export function beginSession(request: Request, person: Person): Promise<void> {
  return new Promise((done, fail) => request.login(person, (error) => (error ? fail(error) : done())));
}

/** Ends this session. */
export function endSession(request: Request): Promise<void> {
  return new Promise((done, fail) => request.logout((error) => (error ? fail(error) : done())));
}

function authenticatorOf(request: Request): Authenticator {
  const authenticator = authenticators.get(request);
  if (!authenticator) throw new Error('the request did not come through the session layers');
  return authenticator;
}

const csrf = csrfSync({
  getTokenFromRequest: (request) => request.get('x-request-token'),
});

/** Refuses a change that does not carry the token of its own session. */
export const refuseForgedRequests: RequestHandler = csrf.csrfSynchronisedProtection;

/** The token that this session's own requests carry in x-request-token. */
export function requestToken(request: Request): string {
  return csrf.generateToken(request);
}
