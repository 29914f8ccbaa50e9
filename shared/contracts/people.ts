import { z } from 'zod';
import { accountStates, organisationKinds, roles } from '../vocabulary/roles.ts';

/** Who is signed in, as every decision about rights sees them. */
export const Person = z.object({
  id: z.uuid(),
  name: z.string(),
  mail: z.string(),
  organisationId: z.uuid(),
  organisationName: z.string(),
  organisationKind: z.enum(organisationKinds),
  roles: z.array(z.enum(roles)),
});
export type Person = z.infer<typeof Person>;

export const PersonSettings = z.object({
  theme: z.enum(['paper', 'bench light']),
  roomyRows: z.boolean(),
  letterKeys: z.boolean(),
});
export type PersonSettings = z.infer<typeof PersonSettings>;

/** What the page asks first: who is here, and the token that its own requests carry. */
export const SessionView = z.object({
  person: Person.nullable(),
  settings: PersonSettings.nullable(),
  requestToken: z.string(),
});
export type SessionView = z.infer<typeof SessionView>;

export const SignIn = z.object({
  mail: z.string().trim().min(1, 'Type your mail address.').max(254),
  password: z.string().min(1, 'Type your password.').max(256),
});
export type SignIn = z.infer<typeof SignIn>;

export const AccountView = Person.extend({
  state: z.enum(accountStates),
  lastHereAt: z.iso.datetime().nullable(),
  version: z.number().int(),
});
export type AccountView = z.infer<typeof AccountView>;
