import { z } from 'zod';
import { caseStates } from '../vocabulary/case-states.ts';
import { signatureMeanings } from '../vocabulary/signatures.ts';
import { Named } from './fractographs.ts';
import { CaseNumber } from './ids.ts';

const reason = (words: string) => z.string().trim().min(1, words).max(2000);
const hash = z.string().regex(/^[0-9a-f]{64}$/, 'A fingerprint has 64 hexadecimal digits.');

export const SentBack = z.object({ reasons: reason('Say why the case goes back; the reasons stay with the round.') });
export type SentBack = z.infer<typeof SentBack>;

/** A note of the readiness list, told by its sentence: an acceptance holds only for exactly what was read. */
export const NoteAccepted = z.object({
  note: z.string().min(1).max(500),
  reason: reason('Say why the note may stand.'),
});
export type NoteAccepted = z.infer<typeof NoteAccepted>;

export const SignatureGiven = z.object({
  meaning: z.enum(signatureMeanings, 'Say what your signature means.'),
  password: z.string().min(1, 'Type your password once more.').max(256),
  /** The fingerprint of what the signer had before them. */
  contentHash: hash,
});
export type SignatureGiven = z.infer<typeof SignatureGiven>;

const Answer = z.object({ allowed: z.boolean(), reason: z.string().nullable() });

export const ReadinessPointView = z.object({
  code: z.string(),
  kind: z.enum(['blocker', 'note']),
  sentence: z.string(),
  chapter: z.enum(['intake', 'evidence', 'fractographs', 'estimates', 'findings']),
  accepted: z.object({ by: Named, at: z.iso.datetime(), reason: z.string() }).nullable(),
});
export type ReadinessPointView = z.infer<typeof ReadinessPointView>;

export const RoundView = z.object({
  round: z.number().int().positive(),
  findingsVersion: z.number().int(),
  sentBy: Named,
  sentAt: z.iso.datetime(),
  outcome: z.enum(['sent back', 'approved']).nullable(),
  reasons: z.string().nullable(),
  endedBy: Named.nullable(),
  endedAt: z.iso.datetime().nullable(),
});
export type RoundView = z.infer<typeof RoundView>;

export const SignatureView = z.object({
  id: z.uuid(),
  personId: z.uuid(),
  printedName: z.string(),
  meaning: z.enum(signatureMeanings),
  signedAt: z.iso.datetime(),
  /** The laboratory's zone at the signing, as "Europe/London". */
  zone: z.string(),
  round: z.number().int(),
  contentHash: hash,
  /** Whether it was given to exactly what stands here now. */
  matches: z.boolean(),
});
export type SignatureView = z.infer<typeof SignatureView>;

export const SealedPartView = z.object({
  key: z.string(),
  /** i to vii; empty where it goes with the part above. */
  chapter: z.string(),
  name: z.string(),
  holding: z.string(),
  /** Null while it still grows: who did what is fingerprinted at the closing itself. */
  hash: hash.nullable(),
});
export type SealedPartView = z.infer<typeof SealedPartView>;

export const ClosureView = z.object({
  sealNumber: z.string(),
  rootHash: hash,
  closedBy: Named,
  closedAt: z.iso.datetime(),
});
export type ClosureView = z.infer<typeof ClosureView>;

export const ReviewView = z.object({
  number: CaseNumber,
  state: z.enum(caseStates),
  readiness: z.array(ReadinessPointView),
  rounds: z.array(RoundView),
  signatures: z.array(SignatureView),
  /** What is sealed, or would be; empty before the first review. */
  parts: z.array(SealedPartView),
  /** What a signature given now would vouch for. */
  contentHash: hash.nullable(),
  closure: ClosureView.nullable(),
  acts: z.object({
    send: Answer,
    sendBack: Answer,
    acceptNotes: Answer,
    sign: z.object({ authored: Answer, checked: Answer, approved: Answer }),
  }),
  zone: z.string(),
});
export type ReviewView = z.infer<typeof ReviewView>;

export const CheckOutcome = z.enum(['same', 'changed', 'missing', 'added']);
export type CheckOutcome = z.infer<typeof CheckOutcome>;

const Checked = z.object({ words: z.string(), outcome: CheckOutcome });

/** A closure looked over again: each part, file, signature and number against the list that was sealed. */
export const ClosureCheckView = z.object({
  checkedAt: z.iso.datetime(),
  /** Whether everything below is as it was. */
  whole: z.boolean(),
  /** The list against its own fingerprint, the seal number, the closing time and the closure before it. */
  seal: z.array(Checked),
  parts: z.array(z.object({ key: z.string(), name: z.string(), outcome: CheckOutcome, deviations: z.array(Checked) })),
  files: z.array(Checked),
  signatures: z.array(Checked),
  estimates: z.array(z.object({ number: z.number().int(), same: z.boolean() })),
});
export type ClosureCheckView = z.infer<typeof ClosureCheckView>;
