import { z } from 'zod';
import { caseStates, urgencies } from '../vocabulary/case-states.ts';
import { lineageKinds } from '../vocabulary/lineage-kinds.ts';
import { originCodes } from '../vocabulary/origin-codes.ts';
import { plainStates } from './cases.ts';
import { Named } from './fractographs.ts';
import { CaseNumber } from './ids.ts';

export const casebookOrders = ['number', 'age', 'state', 'material', 'title'] as const;
export type CasebookOrder = (typeof casebookOrders)[number];
export const pageSizes = [25, 50] as const;

const flag = z.enum(['1']).optional();

/** What the Casebook shows: as it stands in the address of the page. */
export const CasebookQuery = z.object({
  words: z.string().trim().max(200).default(''),
  state: z.enum(['any', 'open', 'on hold', ...caseStates]).default('any'),
  held: z.union([z.enum(['anyone', 'me', 'no one']), z.uuid()]).default('anyone'),
  material: z.union([z.literal('any'), z.uuid()]).default('any'),
  origin: z.enum(['any', ...originCodes]).default('any'),
  /** The year a case was received in. */
  year: z.union([z.enum(['this', 'any']), z.coerce.number().int().min(1900).max(9999)]).default('this'),
  stale: flag,
  /** Only cases in review that wait for a signature of the person who asks. */
  sign: flag,
  order: z.enum(casebookOrders).default('number'),
  direction: z.enum(['ascending', 'descending']).default('descending'),
  page: z.coerce.number().int().min(1).max(100_000).default(1),
  size: z.coerce
    .number()
    .refine((size): size is (typeof pageSizes)[number] => size === 25 || size === 50, 'A page holds 25 or 50 cases.')
    .default(25),
});
export type CasebookQuery = z.infer<typeof CasebookQuery>;

const StaffRow = z.object({
  seenAs: z.literal('laboratory'),
  number: CaseNumber,
  title: z.string(),
  material: z.string().nullable(),
  state: z.enum(caseStates),
  holdUntil: z.iso.date().nullable(),
  urgency: z.enum(urgencies),
  receivedAt: z.iso.datetime(),
  closedAt: z.iso.datetime().nullable(),
  assignedTo: Named.nullable(),
  hasFractographs: z.boolean(),
  originCode: z.enum(originCodes).nullable(),
  /** The newest origin mark on a figure that is ready, and how much to show about it, image px; absent without one. */
  picture: z.object({ fractographId: z.uuid(), x: z.number(), y: z.number(), acrossPx: z.number().int() }).nullable(),
  stale: z.object({ cause: z.enum(lineageKinds), why: z.string(), since: z.iso.datetime() }).nullable(),
});
const FollowedRow = z.object({
  seenAs: z.literal('requester'),
  number: CaseNumber,
  title: z.string(),
  plainState: z.enum(plainStates),
  receivedAt: z.iso.datetime(),
  stateSince: z.iso.datetime(),
});
const NumberRow = z.object({
  seenAs: z.literal('administrator'),
  number: CaseNumber,
  state: z.enum(caseStates),
  holdUntil: z.iso.date().nullable(),
});
export const CasebookRow = z.discriminatedUnion('seenAs', [StaffRow, FollowedRow, NumberRow]);
export type CasebookRow = z.infer<typeof CasebookRow>;
export type StaffRow = z.infer<typeof StaffRow>;
export type FollowedRow = z.infer<typeof FollowedRow>;
export type NumberRow = z.infer<typeof NumberRow>;

export const CasebookPage = z.object({
  rows: z.array(CasebookRow),
  total: z.number().int(),
  asOf: z.iso.datetime(),
});
export type CasebookPage = z.infer<typeof CasebookPage>;

/** Counts behind the tabs and the sentence over the table, under the same walls as the rows. */
export const CasebookCounts = z.object({
  thisYear: z.number().int(),
  all: z.number().int(),
  open: z.number().int(),
  withMe: z.number().int(),
  toSign: z.number().int(),
  stale: z.number().int(),
  inReview: z.number().int(),
  oldestOpenAt: z.iso.datetime().nullable(),
  asOf: z.iso.datetime(),
});
export type CasebookCounts = z.infer<typeof CasebookCounts>;
