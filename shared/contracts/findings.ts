import { z } from 'zod';
import { measuredQuantities } from '../vocabulary/measured-quantities.ts';
import { Named } from './fractographs.ts';
import { CaseNumber, FractographId } from './ids.ts';

/** What the server says on the socket of the findings, beside the text itself. */
export const FindingsNews = z.discriminatedUnion('kind', [
  /** Everything up to the snapshot (Yjs, base64) is in the database since `at`; null while nothing was written. */
  z.object({ kind: z.literal('kept'), at: z.iso.datetime().nullable(), snapshot: z.string() }),
  /** What was typed could not be kept; `again` says whether it is tried again by itself. */
  z.object({ kind: z.literal('not kept'), words: z.string(), again: z.boolean() }),
  /** Something else in the case was done: bound values and figures may read otherwise now. */
  z.object({ kind: z.literal('case changed') }),
]);
export type FindingsNews = z.infer<typeof FindingsNews>;

/** The parts every new text starts with. */
export const findingsOutline = [
  'What was asked',
  'What came in',
  'What the surface shows',
  'Stress at the origin',
  'Why it broke there',
  'What else is at risk',
  'What to do',
] as const;

export const boundSourceKinds = ['estimate', 'measurement', 'material constant'] as const;
export type BoundSourceKind = (typeof boundSourceKinds)[number];
export const boundQuantities = ['stress at the origin', 'outer-fibre stress', 'length', 'constant'] as const;
export type BoundQuantity = (typeof boundQuantities)[number];

/** How a bound value is written: always with its interval, to so many decimals or so many figures of U. */
export const ValueFormat = z.object({
  interval: z.literal(true).default(true),
  decimals: z.number().int().min(0).max(6).nullable().default(null),
  significant: z.number().int().min(1).max(3).nullable().default(null),
});
export type ValueFormat = z.infer<typeof ValueFormat>;

const format = ValueFormat.default({ interval: true, decimals: null, significant: null });

/** Which value to bind. A length is named by its mark: the record of the reading is found or made. */
export const ValueToBind = z.discriminatedUnion('sourceKind', [
  z.object({
    sourceKind: z.literal('estimate'),
    sourceId: z.uuid(),
    quantity: z.enum(['stress at the origin', 'outer-fibre stress']),
    format,
  }),
  z.object({
    sourceKind: z.literal('measurement'),
    markId: z.uuid(),
    measured: z.enum(measuredQuantities),
    quantity: z.literal('length').default('length'),
    format,
  }),
  z.object({
    sourceKind: z.literal('material constant'),
    sourceId: z.uuid(),
    quantity: z.literal('constant').default('constant'),
    format,
  }),
]);
export type ValueToBind = z.infer<typeof ValueToBind>;

/** A value in its parts, each already text; never without its ±, at k = 2. */
export const ValueParts = z.object({ value: z.string(), plusMinus: z.string().min(1), unit: z.string() });
export type ValueParts = z.infer<typeof ValueParts>;

export const BoundValueView = z.object({
  id: z.uuid(),
  sourceKind: z.enum(boundSourceKinds),
  sourceId: z.uuid(),
  quantity: z.enum(boundQuantities),
  /** "Stress at the origin, mirror line". */
  words: z.string(),
  /** Where it comes from: "estimate 5, mirror line, by Ilse Varga". */
  sourceWords: z.string(),
  href: z.string(),
  parts: ValueParts,
  /** "369 ± 27 MPa". */
  text: z.string(),
  /** Why it no longer rests on what is in force, and what it would read; settled by a person. */
  stale: z.object({ why: z.string(), since: z.iso.datetime(), would: z.string().nullable() }).nullable(),
  /** Why an old value was kept all the same. */
  keptBecause: z.string().nullable(),
});
export type BoundValueView = z.infer<typeof BoundValueView>;
export const BoundValueList = z.array(BoundValueView);

const reason = z.string().trim().min(1, 'Say why the old value is kept.').max(1000);
export const OldKept = z.object({ reason });

/** A value that can be bound, as the dialog lists it. */
export const BindableValue = z.object({
  group: z.enum(['Estimates', 'Lengths', 'Constants']),
  words: z.string(),
  detail: z.string(),
  text: z.string(),
  /** As reckoned, so that the page can show how it will read; U is at k = 2 of the standard uncertainty. */
  value: z.object({ value: z.number(), standardUncertainty: z.number(), unit: z.string() }),
  /** "set aside" or "stale"; null for one that stands. A stale one is settled before it is bound. */
  standing: z.string().nullable(),
  bind: ValueToBind,
});
export type BindableValue = z.infer<typeof BindableValue>;
export const BindableList = z.array(BindableValue);

const frame = z.object({
  x: z.number().nonnegative(),
  y: z.number().nonnegative(),
  width: z.number().positive(),
  height: z.number().positive(),
});

export const FigureToPlace = z.object({
  fractographId: FractographId,
  markIds: z.array(z.uuid()).max(60),
  caption: z.string().trim().min(1, 'Say what is seen; the words stand for the picture where it cannot be.').max(1000),
  /** Part of the image shown, image px; null for the whole. */
  framePx: frame.nullable().default(null),
  scaleBar: z.boolean().default(true),
});
export type FigureToPlace = z.infer<typeof FigureToPlace>;

export const FigureView = z.object({
  id: z.uuid(),
  fractographId: FractographId,
  figureNumber: z.number().int().positive(),
  caption: z.string(),
  marks: z.array(z.object({ id: z.uuid(), number: z.number().int(), versionId: z.uuid() })),
  scaleBar: z.boolean(),
  /** False where the image had no scale when the figure was drawn. */
  calibrated: z.boolean(),
  widthPx: z.number().int(),
  heightPx: z.number().int(),
  href: z.string(),
  stale: z.object({ why: z.string(), since: z.iso.datetime() }).nullable(),
});
export type FigureView = z.infer<typeof FigureView>;
export const FigureList = z.array(FigureView);

/** The text with its values written out, as ProseMirror JSON. */
export type FindingsNode = {
  type: string;
  attrs?: Record<string, string | number | boolean | null | string[]>;
  marks?: { type: string }[];
  text?: string;
  content?: FindingsNode[];
};
const attribute = z.union([z.string(), z.number(), z.boolean(), z.null(), z.array(z.string())]);
export const FindingsNode: z.ZodType<FindingsNode> = z.lazy(() =>
  z.object({
    type: z.string(),
    attrs: z.record(z.string(), attribute).optional(),
    marks: z.array(z.object({ type: z.string() })).optional(),
    text: z.string().optional(),
    content: z.array(FindingsNode).optional(),
  }),
);

export const VersionToKeep = z.object({
  name: z.string().trim().min(1, 'Give the version a name, such as "as sent to review".').max(120),
});
export const FindingsVersionLine = z.object({
  id: z.uuid(),
  number: z.number().int().positive(),
  name: z.string(),
  contentHash: z.string(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
});
export type FindingsVersionLine = z.infer<typeof FindingsVersionLine>;
export const FindingsVersionList = z.array(FindingsVersionLine);
export const FindingsVersionView = FindingsVersionLine.extend({ content: FindingsNode });
export type FindingsVersionView = z.infer<typeof FindingsVersionView>;

/** What the readiness list asks of the text. */
export const FindingsFacts = z.object({
  wordCount: z.number().int(),
  /** Stale values and figures that stand in the text, each with the part it is in. */
  staleBoundValues: z.array(z.object({ id: z.uuid(), words: z.string(), part: z.string(), why: z.string() })),
  figures: z.number().int(),
  /** The words of the text alone, so that others can look for a piece's name in it. */
  text: z.string(),
  /** Values and figures in the text that are not of this case. */
  unresolved: z.number().int(),
  emptyParts: z.array(z.string()),
});
export type FindingsFacts = z.infer<typeof FindingsFacts>;

export const BoundValuePath = z.object({ number: CaseNumber, boundValueId: z.uuid() });
export const FigurePath = z.object({ number: CaseNumber, figureId: z.uuid() });
export const VersionPath = z.object({ number: CaseNumber, versionNumber: z.coerce.number().int().positive() });
