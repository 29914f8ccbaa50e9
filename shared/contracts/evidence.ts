import { z } from 'zod';
import { parseMeasured } from '../numeric/units/parse-measured.ts';
import { materialFamilies } from '../vocabulary/constant-kinds.ts';
import { faces, fragmentStatuses, fragmentWays, originLies } from '../vocabulary/pieces.ts';
import { Named } from './fractographs.ts';
import { CaseNumber } from './ids.ts';

const longestLine = 300;
const optionalLine = z
  .string()
  .trim()
  .max(longestLine, 'Keep it under 300 characters.')
  .nullable()
  .transform((text) => (text === '' ? null : text));
const optionalId = z.union([z.uuid(), z.literal('').transform(() => null)], 'Choose one of the list.').nullable();
const optionalDay = z
  .union([z.iso.date(), z.literal('').transform(() => null)], 'Type the date as 2026-03-24.')
  .nullable();
const line = (whenEmpty: string) =>
  z.string().trim().min(1, whenEmpty).max(longestLine, 'Keep it under 300 characters.');
const version = z.number().int().positive();
// Nothing is colder than absolute zero.
const absoluteZeroC = -273.15;

export const PartDetails = z.object({
  description: line('Say what broke.'),
  serial: optionalLine,
  drawing: optionalLine,
  maker: optionalLine,
  materialId: optionalId,
  environment: optionalLine,
  temperatureC: z
    .number('Type a temperature in °C.')
    .min(absoluteZeroC, 'Nothing is colder than −273.15 °C.')
    .nullable(),
  serviceTime: optionalLine,
});
export type PartDetails = z.infer<typeof PartDetails>;

/** Carries the version that was seen when the change was begun. */
export const PartChange = PartDetails.extend({ version });
export type PartChange = z.infer<typeof PartChange>;

const typedMass = optionalLine.superRefine((typed, context) => {
  const read = typed === null ? null : parseMeasured(typed, { kind: 'mass', openUnit: true });
  if (read?.kind === 'refused') context.addIssue({ code: 'custom', message: read.reason });
});

const pieceLines = {
  description: line('Say what the piece is.'),
  /** As typed, value ± U (k = 2) with its unit; null while not weighed. */
  mass: typedMass,
  condition: optionalLine,
  receivedOn: optionalDay,
};

export const PieceReceived = z
  .object({
    ...pieceLines,
    partId: z.uuid('Say what it is a piece of.'),
    /** The piece it was made from; null for a piece of the part as received. */
    parentId: optionalId,
    way: z.enum(fragmentWays),
    place: line('Say where it is.'),
    holder: line('Say who has it.'),
  })
  .refine((piece) => piece.way === 'break' || piece.parentId !== null, {
    path: ['parentId'],
    message: 'Say which piece it was made from.',
  });
export type PieceReceived = z.infer<typeof PieceReceived>;

const missingReason = line('Say why it is not there.');
const answerWanted = 'Answer whether the origin may lie on it: no, not known or yes.';
const mayOriginLie = z.string(answerWanted).pipe(z.enum(originLies, answerWanted));

export const MissingNoted = z.object({
  partId: z.uuid('Say what it is a piece of.'),
  description: line('Say what the piece is.'),
  missingReason,
  originLies: mayOriginLie,
});
export type MissingNoted = z.infer<typeof MissingNoted>;

const Gone = z.object({ status: z.literal('missing'), missingReason, originLies: mayOriginLie });
const Held = z.object({
  status: z.enum(['present', 'consumed']),
  place: line('Say where it is.'),
  holder: line('Say who has it.'),
});

/** Carries the version that was seen when the change was begun. */
export const PieceChange = z
  .object({
    ...pieceLines,
    version,
    status: z.enum(fragmentStatuses),
    missingReason: optionalLine,
    originLies: z.string().nullable(),
    place: optionalLine,
    holder: optionalLine,
  })
  .transform((change, context) => {
    const { status, missingReason, originLies, place, holder, ...lines } = change;
    const how =
      status === 'missing'
        ? Gone.safeParse({ status, missingReason: missingReason ?? '', originLies })
        : Held.safeParse({ status, place: place ?? '', holder: holder ?? '' });
    if (how.success) return { ...lines, how: how.data };
    for (const { message, path } of how.error.issues) context.addIssue({ code: 'custom', message, path: [...path] });
    return z.NEVER;
  });
export type PieceChange = z.infer<typeof PieceChange>;

const FaceOfPiece = z.object({ fragmentId: z.uuid('Choose a piece.'), face: z.enum(faces, 'Choose a face, A or B.') });

export const FacesPaired = z
  .object({ one: FaceOfPiece, other: FaceOfPiece, crack: optionalLine })
  .refine(({ one, other }) => one.fragmentId !== other.fragmentId || one.face !== other.face, {
    path: ['other'],
    message: 'A face is not its own mate: choose another.',
  });
export type FacesPaired = z.infer<typeof FacesPaired>;

export const FacesParted = z.object({ version, reason: line('Say why they are parted.') });
export type FacesParted = z.infer<typeof FacesParted>;

export const PieceView = z.object({
  id: z.uuid(),
  partId: z.uuid(),
  parentId: z.uuid().nullable(),
  code: z.string(),
  description: z.string(),
  way: z.enum(fragmentWays),
  status: z.enum(fragmentStatuses),
  missingReason: z.string().nullable(),
  originLies: z.enum(originLies).nullable(),
  /** In g with U (k = 2) in g, and as typed; null while not weighed. */
  mass: z.object({ g: z.number(), uncertaintyG: z.number(), entered: z.string().nullable() }).nullable(),
  place: z.string(),
  holder: z.string(),
  condition: z.string().nullable(),
  receivedOn: z.iso.date().nullable(),
  madeAt: z.iso.datetime(),
  version,
});
export type PieceView = z.infer<typeof PieceView>;

export const PartView = z.object({
  id: z.uuid(),
  description: z.string(),
  serial: z.string().nullable(),
  drawing: z.string().nullable(),
  maker: z.string().nullable(),
  material: Named.extend({ family: z.enum(materialFamilies) }).nullable(),
  environment: z.string().nullable(),
  /** °C. */
  temperatureC: z.number().nullable(),
  serviceTime: z.string().nullable(),
  version,
});
export type PartView = z.infer<typeof PartView>;

const FaceView = z.object({ fragmentId: z.uuid(), code: z.string(), face: z.enum(faces) });

export const MatePairView = z.object({
  id: z.uuid(),
  one: FaceView,
  other: FaceView,
  crack: z.string().nullable(),
  pairedBy: Named,
  pairedAt: z.iso.datetime(),
  partedAt: z.iso.datetime().nullable(),
  version,
});
export type MatePairView = z.infer<typeof MatePairView>;

export const EvidenceView = z.object({
  parts: z.array(PartView),
  /** Every piece of every part, a piece before what was made from it. */
  pieces: z.array(PieceView),
  /** The pairs that hold now. */
  mates: z.array(MatePairView),
  /** The answer to who asks: may the pieces be changed now, and if not, why. */
  change: z.object({ allowed: z.boolean(), reason: z.string().nullable() }),
  closedAt: z.iso.datetime().nullable(),
});
export type EvidenceView = z.infer<typeof EvidenceView>;

export const PartPath = z.object({ number: CaseNumber, partId: z.uuid() });
export const PiecePath = z.object({ number: CaseNumber, pieceId: z.uuid() });
export const MatePath = z.object({ number: CaseNumber, mateId: z.uuid() });
