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

/** Whom a bare password or a bare mail address speaks of is settled by the server; these only shape what is typed. */
const PersonName = z.string().trim().min(1, 'Type a name.').max(120, 'A name has at most 120 characters.');
const MailAddress = z.string().trim().max(254).pipe(z.email('A mail address reads name@organisation.example.'));
const Version = z.number().int().positive();

/** What has become of the mail that carries an invitation. */
export const mailStates = ['waiting', 'gone', 'came back'] as const;

export const OrganisationView = z.object({
  id: z.uuid(),
  name: z.string(),
  kind: z.enum(organisationKinds),
  version: z.number().int(),
});
export type OrganisationView = z.infer<typeof OrganisationView>;

export const AccountView = Person.extend({
  state: z.enum(accountStates),
  lastHereAt: z.iso.datetime().nullable(),
  version: z.number().int(),
  /** The invitation still open, where there is one. */
  invitation: z
    .object({
      sentAt: z.iso.datetime(),
      endsAt: z.iso.datetime(),
      mail: z.enum(mailStates).nullable(),
      fault: z.string().nullable(),
    })
    .nullable(),
});
export type AccountView = z.infer<typeof AccountView>;

export const PeopleView = z.object({ organisations: z.array(OrganisationView), accounts: z.array(AccountView) });
export type PeopleView = z.infer<typeof PeopleView>;

/** The laboratory's own people, as far as colleagues need to know them. */
export const StaffView = z.array(z.object({ id: z.uuid(), name: z.string(), roles: z.array(z.enum(roles)) }));
export type StaffView = z.infer<typeof StaffView>;

export const Invitation = z.object({
  name: PersonName,
  mail: MailAddress,
  organisationId: z.uuid('Choose the organisation.'),
  roles: z.array(z.enum(roles)).min(1, 'Choose at least one role.'),
});
export type Invitation = z.infer<typeof Invitation>;

export const AccountChange = Invitation.extend({ version: Version });
export type AccountChange = z.infer<typeof AccountChange>;

export const VersionSeen = z.object({ version: Version });
export type VersionSeen = z.infer<typeof VersionSeen>;

export const OrganisationEntry = z.object({
  name: z.string().trim().min(1, 'Type the name of the organisation.').max(120),
  kind: z.enum(organisationKinds),
});
export type OrganisationEntry = z.infer<typeof OrganisationEntry>;

export const OrganisationChange = OrganisationEntry.pick({ name: true }).extend({ version: Version });
export type OrganisationChange = z.infer<typeof OrganisationChange>;

/** Whom a link is for: the page greets by it before a password is chosen. */
export const LinkView = z.object({ name: z.string(), mail: z.string(), organisationName: z.string() });
export type LinkView = z.infer<typeof LinkView>;

export const ChosenPassword = z.object({ password: z.string().max(256, 'A password has at most 256 characters.') });
export type ChosenPassword = z.infer<typeof ChosenPassword>;

export const PasswordAsk = z.object({ mail: MailAddress });
export type PasswordAsk = z.infer<typeof PasswordAsk>;

export const PasswordChange = ChosenPassword.extend({
  current: z.string().min(1, 'Type your current password.').max(256),
});
export type PasswordChange = z.infer<typeof PasswordChange>;

export const OwnName = z.object({ name: PersonName, version: Version });
export type OwnName = z.infer<typeof OwnName>;

export const OwnView = z.object({
  name: z.string(),
  mail: z.string(),
  version: z.number().int(),
  settings: PersonSettings,
});
export type OwnView = z.infer<typeof OwnView>;

export const SettingsChange = PersonSettings.partial();
export type SettingsChange = z.infer<typeof SettingsChange>;
