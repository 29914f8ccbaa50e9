import connectPgSimple from 'connect-pg-simple';
import { csrfSync } from 'csrf-sync';
import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import passport from 'passport';
import type { Person } from '#shared/contracts/people.ts';
import type { Database } from '../database/connection.ts';

const halfHour = 30 * 60 * 1000;

export type SessionSettings = {
  secret: string;
  /** Cookies only over https; off on plain loopback. */
  secureCookies: boolean;
  findPerson(id: string): Promise<Person | null>;
};

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
  ];
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
