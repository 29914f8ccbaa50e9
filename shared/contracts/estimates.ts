import { z } from 'zod';
import { ourUnits } from '../numeric/units/our-units.ts';
import { constantKinds, sourceStandings } from '../vocabulary/constant-kinds.ts';
import { estimateLines, verdicts } from '../vocabulary/estimate-lines.ts';
import { lineageKinds } from '../vocabulary/lineage-kinds.ts';
import { measuredQuantities } from '../vocabulary/measured-quantities.ts';
import { mirrorBoundaries } from '../vocabulary/mirror-boundaries.ts';
import { uncertaintyForms } from '../vocabulary/uncertainty-forms.ts';
import { Named } from './fractographs.ts';
import { CaseNumber, FractographId } from './ids.ts';

/** An input that is typed, with its unit, its uncertainty and how that is stated. */
export const TypedInput = z.object({
  from: z.literal('typed'),
  text: z.string().max(80),
  /** "0.01 mm", "6 %" of the value, or a bare number in the unit of the value. */
  uncertaintyText: z.string().max(80).default(''),
  uncertaintyAs: z.enum(uncertaintyForms).default('standard'),
  /** Where it was read, or why it is so: "caliper C-7", "half-round at the surface". */
  note: z.string().trim().max(500).default(''),
  /** For a mirror radius or a mirror constant: which edge it is of. */
  boundary: z.enum(mirrorBoundaries).nullable().default(null),
});

/** An input read off a mark on its image's scale. */
export const MarkInput = z.object({
  from: z.literal('mark'),
  markId: z.uuid(),
  quantity: z.enum(measuredQuantities),
  /** The reader's own relative standard uncertainty, %; it stands in place of the reading's. */
  relativeUncertaintyPercent: z.number().positive().max(100).nullable().default(null),
});

/** An input that is a constant of a material. */
export const ConstantInput = z.object({ from: z.literal('constant'), constantId: z.uuid() });

export const WantedInput = z.discriminatedUnion('from', [TypedInput, MarkInput, ConstantInput]);
export type WantedInput = z.infer<typeof WantedInput>;

export const EstimateWanted = z.object({
  method: z.string().max(60),
  inputs: z.record(z.string().max(40), WantedInput),
  /** The estimate this one stands in for. */
  supersedesId: z.uuid().nullable().default(null),
  /** Why a radius and a constant of different boundaries are used together; empty where they match. */
  boundaryNote: z.string().trim().max(500).default(''),
  remark: z.string().trim().max(2000).default(''),
});
export type EstimateWanted = z.infer<typeof EstimateWanted>;
/** As a client may leave parts out. */
export type EstimateWantedInput = z.input<typeof EstimateWanted>;

const reason = (words: string) => z.string().trim().min(1, words).max(1000);
export const EstimateRenewed = z.object({ remark: z.string().trim().max(2000).default('') });
export const OldValueKept = z.object({ reason: reason('Say why the old value is kept.') });
export const StandingChanged = z.object({
  standing: z.enum(['in use', 'set aside']),
  reason: reason('Say why; it stands beside the line in the report.'),
});

/** A stress never goes without its interval: U is at k = 2. */
export const StressView = z.object({
  value: z.number(),
  standardUncertainty: z.number().positive(),
  expandedUncertainty: z.number().positive(),
  unit: z.literal('MPa'),
  /** "350 ± 14 MPa". */
  text: z.string(),
});
export type StressView = z.infer<typeof StressView>;

export const OutputView = z.object({
  name: z.string(),
  label: z.string(),
  symbol: z.string(),
  value: z.number(),
  /** Null for a plain ratio only. */
  standardUncertainty: z.number().nullable(),
  expandedUncertainty: z.number().nullable(),
  unit: z.enum(ourUnits),
});

export const InputSourceView = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('typed'), note: z.string() }),
  z.object({
    kind: z.literal('measurement'),
    measurementId: z.uuid(),
    markId: z.uuid(),
    markNumber: z.number().int(),
    quantity: z.enum(measuredQuantities),
    fractographId: FractographId,
    figureNumber: z.number().int(),
    readBy: z.string(),
    readAt: z.iso.datetime(),
    calibrationId: z.uuid(),
  }),
  z.object({
    kind: z.literal('material constant'),
    constantId: z.uuid(),
    constantKind: z.enum(constantKinds),
    recordNumber: z.number().int(),
    materialId: z.uuid(),
    materialName: z.string(),
    source: z.string(),
    sourceStanding: z.enum(sourceStandings),
  }),
]);
export type InputSourceView = z.infer<typeof InputSourceView>;

export const InputView = z.object({
  name: z.string(),
  label: z.string(),
  symbol: z.string(),
  value: z.number(),
  standardUncertainty: z.number(),
  unit: z.enum(ourUnits),
  distribution: z.enum(['normal', 'rectangular', 'triangular']),
  /** "291 ± 16 µm", k = 2. */
  text: z.string(),
  enteredText: z.string().nullable(),
  enteredUnit: z.string().nullable(),
  /** As it was stated: "6 %, standard". */
  enteredUncertainty: z.string().nullable(),
  boundary: z.enum(mirrorBoundaries).nullable(),
  source: InputSourceView,
  stale: z.boolean(),
});
export type InputView = z.infer<typeof InputView>;

export const BudgetView = z.object({
  input: z.string(),
  label: z.string(),
  symbol: z.string(),
  /** ± of the input itself, k = 2, in words with its unit. */
  plusMinus: z.string(),
  sensitivity: z.number(),
  standardUncertainty: z.number(),
  contribution: z.number(),
  /** Part of the variance, 0 to 1. */
  share: z.number(),
});
export type BudgetView = z.infer<typeof BudgetView>;

export const CautionView = z.object({
  code: z.string(),
  weight: z.enum(['note', 'warning']),
  sentence: z.string(),
  /** What the person said who went on all the same. */
  note: z.string().optional(),
});

/** Where a number comes from, one step a node. */
export type SourceNode = {
  kind: (typeof lineageKinds)[number] | 'typed';
  id: string | null;
  words: string;
  stale: boolean;
  href: string | null;
  from: SourceNode[];
};
export const SourceNode: z.ZodType<SourceNode> = z.lazy(() =>
  z.object({
    kind: z.enum([...lineageKinds, 'typed']),
    id: z.uuid().nullable(),
    words: z.string(),
    stale: z.boolean(),
    href: z.string().nullable(),
    from: z.array(SourceNode),
  }),
);

/** Why an estimate rests on something that holds no longer, and what it would become. */
export const EstimateStaleView = z.object({
  since: z.iso.datetime(),
  causes: z.array(
    z.object({
      kind: z.enum(lineageKinds),
      id: z.uuid(),
      replacedById: z.uuid().nullable(),
      why: z.string(),
      since: z.iso.datetime(),
    }),
  ),
  /** What the inputs read now, where they read otherwise. */
  changes: z.array(z.object({ input: z.string(), label: z.string(), was: z.string(), now: z.string() })),
  wouldBe: StressView.nullable(),
  /** Why it cannot be reckoned again from what is in force. */
  hindrance: z.string().nullable(),
  verdictNow: z.enum(verdicts),
  verdictThen: z.enum(verdicts).nullable(),
});
export type EstimateStaleView = z.infer<typeof EstimateStaleView>;

export const EstimateView = z.object({
  id: z.uuid(),
  /** Estimate n, through the case. */
  number: z.number().int().positive(),
  line: z.enum(estimateLines),
  method: z.object({
    id: z.string(),
    version: z.number().int(),
    title: z.string(),
    symbols: z.string(),
    source: z.string(),
    sourceTag: z.string(),
  }),
  /** Stress at the origin. */
  origin: StressView,
  /** Everything that came out; in a bar the stress on the tensile face and at the origin under two names. */
  outputs: z.array(OutputView),
  inputs: z.array(InputView),
  formula: z.string(),
  budget: z.array(BudgetView),
  cautions: z.array(CautionView),
  sources: z.array(SourceNode),
  supersedesId: z.uuid().nullable(),
  supersededById: z.uuid().nullable(),
  /** Set aside lines stay shown, with the reason. */
  standing: z.object({
    standing: z.enum(['in use', 'set aside']),
    reason: z.string(),
    by: Named.nullable(),
    at: z.iso.datetime().nullable(),
  }),
  /** The newest of its line that is neither superseded nor set aside: the one that is compared. */
  isCompared: z.boolean(),
  stale: EstimateStaleView.nullable(),
  /** What was settled by keeping the old value, with the reason given. */
  kept: z.array(z.object({ why: z.string(), reason: z.string(), at: z.iso.datetime() })),
  remark: z.string(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
});
export type EstimateView = z.infer<typeof EstimateView>;

/** The verdict over the lines in force; shown, not kept. */
export const AgreementView = z.object({
  ruleVersion: z.number().int(),
  verdict: z.enum(verdicts),
  weakly: z.boolean(),
  /** The numbers behind the word, in sentences. */
  words: z.string(),
  pattern: z.string(),
  pairs: z.array(
    z.object({
      lines: z.tuple([z.enum(estimateLines), z.enum(estimateLines)]),
      en: z.number(),
      zeta: z.number(),
      verdict: z.enum(['agree', 'doubtful', 'disagree']),
      sharedInputs: z.array(z.string()),
    }),
  ),
  chiSquared: z.number().nullable(),
  pooled: StressView.nullable(),
});
export type AgreementView = z.infer<typeof AgreementView>;

export const EstimatesView = z.object({ estimates: z.array(EstimateView), agreement: AgreementView });
export type EstimatesView = z.infer<typeof EstimatesView>;

/** A stored estimate run again by its own method version on its own inputs. */
export const RecomputedView = z.object({
  estimateId: z.uuid(),
  number: z.number().int(),
  same: z.boolean(),
  /** Largest relative difference of any output, of U or of a budget share. */
  largestDifference: z.number(),
  stored: StressView,
  recomputed: StressView.nullable(),
});
export type RecomputedView = z.infer<typeof RecomputedView>;

export const EstimatePath = z.object({ number: CaseNumber, estimateId: z.uuid() });
