import { z } from 'zod';
import { caseKinds, caseStates, standings, urgencies } from '../vocabulary/case-states.ts';
import { Named } from './fractographs.ts';
import { CaseId, CaseNumber } from './ids.ts';

const title = z.string().trim().min(1, 'Say in a few words what broke and how.').max(160);
const summary = z.string().trim().max(2000);
const reason = z.string().trim().min(1, 'Say why.').max(1000);
const versionSeen = z.number().int();

/** One question as agreed with the requester; the key stays when the wording changes. */
export const Question = z.object({
  key: z.string().min(1).max(40),
  text: z.string().trim().min(1, 'Type the question, or take the line out.').max(500),
});
export type Question = z.infer<typeof Question>;

export const CaseOpened = z.object({
  title,
  summary,
  kind: z.enum(caseKinds),
  urgency: z.enum(urgencies),
  organisationId: z.uuid('Say who asks.'),
  materialId: z.uuid().nullable(),
  questions: z.array(Question).max(20),
});
export type CaseOpened = z.infer<typeof CaseOpened>;

/** A change names the version it was made from; fields left out stay as they are. */
export const CaseChanged = CaseOpened.omit({ organisationId: true, questions: true })
  .extend({ scope: z.string().trim().max(2000) })
  .partial()
  .extend({ versionSeen });
export type CaseChanged = z.infer<typeof CaseChanged>;

export const CaseGiven = z.object({ personId: z.uuid().nullable(), versionSeen });
export const CaseTaken = z.object({ versionSeen });
export const CaseMoved = z.object({ to: z.enum(['examining', 'drafting']), versionSeen });
export const CaseHeld = z.object({ reason, until: z.iso.date('Say until which day.'), versionSeen });
export const CaseResumed = z.object({ versionSeen });
export const CaseWithdrawn = z.object({ reason, versionSeen });
export const CaseRestricted = z.object({
  restricted: z.boolean(),
  namedPersonIds: z.array(z.uuid()).max(100),
  versionSeen,
});
export type CaseRestricted = z.infer<typeof CaseRestricted>;

/** What anyone who follows a case reads of its state. */
export const plainStates = ['received', 'looked at', 'written up', 'being checked', 'answered', 'withdrawn'] as const;
export type PlainState = (typeof plainStates)[number];

/** A case as its requester sees it: the state in plain words, since when, and nothing of its content. */
export const FollowedCase = z.object({
  seenAs: z.literal('requester'),
  number: CaseNumber,
  title: z.string(),
  plainState: z.enum(plainStates),
  receivedAt: z.iso.datetime(),
  stateSince: z.iso.datetime(),
});
export type FollowedCase = z.infer<typeof FollowedCase>;

export const Hold = z.object({ reason: z.string(), until: z.iso.date(), since: z.iso.datetime() });

export const CaseView = z.object({
  seenAs: z.literal('laboratory'),
  id: CaseId,
  number: CaseNumber,
  title: z.string(),
  summary: z.string(),
  kind: z.enum(caseKinds),
  state: z.enum(caseStates),
  hold: Hold.nullable(),
  withdrawnReason: z.string().nullable(),
  urgency: z.enum(urgencies),
  organisation: Named,
  material: Named.nullable(),
  assignedTo: Named.nullable(),
  restricted: z.boolean(),
  namedPeople: z.array(Named),
  authorIds: z.array(z.uuid()),
  scope: z.string(),
  receivedAt: z.iso.datetime(),
  stateSince: z.iso.datetime(),
  closedAt: z.iso.datetime().nullable(),
  sealNumber: z.string().nullable(),
  counts: z.object({
    fractographs: z.number().int(),
    estimates: z.number().int(),
    /** Estimates that rest on something since replaced. */
    stale: z.number().int(),
    /** Values bound in the findings of which the same is true. */
    staleInText: z.number().int(),
  }),
  version: z.number().int(),
  asOf: z.iso.datetime(),
});
export type CaseView = z.infer<typeof CaseView>;

export const CaseAnswer = z.discriminatedUnion('seenAs', [CaseView, FollowedCase]);
export type CaseAnswer = z.infer<typeof CaseAnswer>;

/** A new set of questions replaces the whole of the last; the version seen is that of the set. */
export const QuestionsAgreed = z.object({
  questions: z.array(Question).max(20),
  besideScope: z.string().trim().max(2000),
  reason: z.string().trim().max(1000),
  versionSeen,
});
export type QuestionsAgreed = z.infer<typeof QuestionsAgreed>;

export const QuestionsView = z.object({
  version: z.number().int(),
  questions: z.array(Question),
  besideScope: z.string(),
  reason: z.string().nullable(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
});
export type QuestionsView = z.infer<typeof QuestionsView>;
/** Every version, newest first. */
export const QuestionsHistory = z.array(QuestionsView);

export const BackgroundGiven = z.object({
  statement: z.string().trim().min(1, 'Type the statement.').max(2000),
  standing: z.enum(standings),
  source: z.string().trim().min(1, 'Say where it comes from.').max(300),
  givenOn: z.iso.date('Say on which day it was given.'),
});
export type BackgroundGiven = z.infer<typeof BackgroundGiven>;
export const BackgroundChanged = BackgroundGiven.extend({ versionSeen });
export const BackgroundTakenBack = z.object({ versionSeen, reason });

export const BackgroundView = BackgroundGiven.extend({
  id: z.uuid(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
  version: z.number().int(),
});
export type BackgroundView = z.infer<typeof BackgroundView>;
export const BackgroundList = z.array(BackgroundView);
export const BackgroundPath = z.object({ number: CaseNumber, backgroundId: z.uuid() });

export const HistoryQuery = z.object({ before: z.coerce.number().int().positive().optional() });
export const HistoryEntry = z.object({
  id: z.number().int(),
  at: z.iso.datetime(),
  personName: z.string(),
  words: z.string(),
  reason: z.string().nullable(),
});
export type HistoryEntry = z.infer<typeof HistoryEntry>;
export const HistoryPage = z.object({ entries: z.array(HistoryEntry), hasEarlier: z.boolean() });
export type HistoryPage = z.infer<typeof HistoryPage>;

/** Whom a case may be given to, who may ask, and the materials: what forms offer. */
export const CaseChoices = z.object({
  analysts: z.array(Named),
  staff: z.array(Named),
  organisations: z.array(Named),
  materials: z.array(Named),
});
export type CaseChoices = z.infer<typeof CaseChoices>;
