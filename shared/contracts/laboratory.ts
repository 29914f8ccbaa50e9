import { z } from 'zod';
import { mailStates } from './people.ts';

/** What the head of the place says. */
export const LaboratoryView = z.object({
  name: z.string(),
  /** Mails that came back and that nobody has sent again. */
  cameBack: z.number().int(),
  trailEntries: z.number().int(),
});
export type LaboratoryView = z.infer<typeof LaboratoryView>;

/** One message of the outbox: to whom, about what, and what became of it. Never its link. */
export const MailView = z.object({
  id: z.uuid(),
  toMail: z.string(),
  subject: z.string(),
  state: z.enum(mailStates),
  tries: z.number().int(),
  fault: z.string().nullable(),
  writtenAt: z.iso.datetime(),
  goneAt: z.iso.datetime().nullable(),
});
export type MailView = z.infer<typeof MailView>;

/** A message in the box on this machine; its words come only when it is opened. */
export const HeldMailView = z.object({
  id: z.uuid(),
  toMail: z.string(),
  subject: z.string(),
  heldAt: z.iso.datetime(),
});
export type HeldMailView = z.infer<typeof HeldMailView>;

export const HeldMailOpened = HeldMailView.extend({ body: z.string() });
export type HeldMailOpened = z.infer<typeof HeldMailOpened>;

/** Newest first; `older` asks for what follows it. */
export const MailPage = z.object({ mails: z.array(MailView), older: z.uuid().nullable() });
export type MailPage = z.infer<typeof MailPage>;
export const MailQuery = z.object({ before: z.uuid().optional() });

export const HeldMailPage = z.object({ mails: z.array(HeldMailView), older: z.uuid().nullable() });
export type HeldMailPage = z.infer<typeof HeldMailPage>;

export const TrailQuery = z.object({
  /** The entry that ended the page before. */
  before: z.coerce.number().int().positive().optional(),
  personId: z.uuid().optional(),
  act: z.string().max(80).optional(),
  /** Instants: from included, until not. */
  from: z.iso.datetime({ offset: true }).optional(),
  until: z.iso.datetime({ offset: true }).optional(),
});
export type TrailQuery = z.infer<typeof TrailQuery>;

export const TrailEntry = z.object({
  id: z.number().int(),
  at: z.iso.datetime(),
  personName: z.string(),
  act: z.string(),
  words: z.string(),
  /** The case it happened in; of a case only number and states are shown here. */
  caseNumber: z.string().nullable(),
  /** Whom or what it was done to, where that has a name. */
  object: z.string().nullable(),
  before: z.unknown(),
  after: z.unknown(),
  reason: z.string().nullable(),
});
export type TrailEntry = z.infer<typeof TrailEntry>;

export const TrailPage = z.object({
  entries: z.array(TrailEntry),
  older: z.number().int().nullable(),
  acts: z.array(z.object({ act: z.string(), words: z.string() })),
});
export type TrailPage = z.infer<typeof TrailPage>;

/** Whether the trail still is what was written: entries recomputed, and in each broken chain the first that differs. */
export const TrailCheck = z.object({
  chains: z.number().int(),
  entries: z.number().int(),
  broken: z.array(
    z.object({
      /** The case's number, or null for the laboratory's own chain. */
      caseNumber: z.string().nullable(),
      entryId: z.number().int(),
      at: z.iso.datetime(),
      words: z.string(),
      personName: z.string(),
      fault: z.enum(['altered', 'entry missing before it']),
    }),
  ),
});
export type TrailCheck = z.infer<typeof TrailCheck>;
