import { boolean, index, integer, pgTable, primaryKey, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import { accountStates, organisationKinds, roles } from '../../../shared/vocabulary/roles.ts';
import { id, instant } from '../columns.ts';

export const organisations = pgTable('organisations', {
  id: id(),
  name: text().notNull().unique(),
  kind: text({ enum: organisationKinds }).notNull(),
  version: integer().notNull().default(1),
});

export const people = pgTable(
  'people',
  {
    id: id(),
    organisationId: uuid()
      .notNull()
      .references(() => organisations.id),
    name: text().notNull(),
    mail: text().notNull(),
    passwordHash: text(),
    state: text({ enum: accountStates }).notNull(),
    theme: text({ enum: ['paper', 'bench light'] })
      .notNull()
      .default('paper'),
    roomyRows: boolean().notNull().default(false),
    letterKeys: boolean().notNull().default(true),
    lastHereAt: instant(),
    madeAt: instant().notNull(),
    version: integer().notNull().default(1),
  },
  (t) => [uniqueIndex('people_mail_idx').on(sql`lower(${t.mail})`), index().on(t.organisationId)],
);

export const personRoles = pgTable(
  'person_roles',
  {
    personId: uuid()
      .notNull()
      .references(() => people.id),
    role: text({ enum: roles }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.role] })],
);

/** Invitations and password resets: only the hash of the token is kept. */
export const oneTimeLinks = pgTable('one_time_links', {
  id: id(),
  purpose: text({ enum: ['invitation', 'password'] }).notNull(),
  personId: uuid()
    .notNull()
    .references(() => people.id),
  tokenHash: text().notNull().unique(),
  madeBy: uuid().references(() => people.id),
  madeAt: instant().notNull(),
  endsAt: instant().notNull(),
  usedAt: instant(),
  takenBackAt: instant(),
});

/** Failed tries by address and by machine, so that a wait tells nothing about which part was wrong. */
export const signInTries = pgTable('sign_in_tries', {
  key: text().primaryKey(),
  failures: integer().notNull(),
  firstAt: instant().notNull(),
  lockedUntil: instant(),
});
