// One file per method and version here; `numeric/methods.ts` is the table that lists them.
import type { OurUnit, UnitKind } from '../units/our-units.ts';
import type { Distribution } from '../uncertainty/standard-uncertainty.ts';

/** The line of reasoning an estimate belongs to; `supporting` methods give ratios, factors and checks. */
export type MethodLine = 'load' | 'mirror' | 'flaw' | 'supporting';

type Named = {
  /** As in the reference values: load, outerSpan, KIc. */
  readonly name: string;
  /** On forms: "Outer span". */
  readonly label: string;
};

type Measured = Named & {
  readonly symbol: string;
  readonly unit: OurUnit;
  readonly unitKind: UnitKind;
  /** What the formula calls it, so that a refusal can name the input. */
  readonly argument: string;
  /** In words: "more than 0". */
  readonly limits: string;
  /** True where a bare number must not be typed, because people use several units here. */
  readonly openUnit: boolean;
  /** `expected` ones must carry an uncertainty before the method gives an estimate. */
  readonly uncertainty: 'expected' | 'none';
  readonly optional?: true;
};

export type NumberInput = Measured & { readonly kind: 'number'; readonly default?: number };
export type ListInput = Measured & { readonly kind: 'list'; readonly fewest: number };
export type CodeInput = Named & {
  readonly kind: 'code';
  /** Empty where the method reads what is written by rules of its own. */
  readonly choices: readonly { readonly code: string; readonly label: string }[];
  readonly default?: string;
  readonly optional?: true;
};
export type MethodInput = NumberInput | ListInput | CodeInput;

export type MethodOutput = Named & {
  readonly symbol: string;
  /** `null` for an output that is a word or a yes. */
  readonly unit: OurUnit | null;
};

export type GivenNumber = {
  readonly value: number;
  /** In the input's unit, ≥ 0; 0 says exact, absent says not stated. */
  readonly standardUncertainty?: number;
  readonly distribution?: Distribution;
};
export type GivenList = { readonly values: readonly number[]; readonly standardUncertainties?: readonly number[] };
export type GivenCode = { readonly code: string };
export type GivenInputs = Readonly<Record<string, GivenNumber | GivenList | GivenCode>>;

export type Outputs = Readonly<Record<string, number | string | boolean | readonly number[] | readonly string[]>>;

/** Something to know beside a number that is still given. */
export type Caution = { readonly code: string; readonly weight: 'note' | 'warning'; readonly sentence: string };

export type SourceTag = 'looked up' | 're-derived' | 'practice' | 'from memory';

export type Method = {
  readonly id: string;
  /** Starts at 1; a changed formula is a new entry with the next number, and the old one stays. */
  readonly version: number;
  readonly line: MethodLine;
  readonly title: string;
  readonly inputs: readonly MethodInput[];
  readonly outputs: readonly MethodOutput[];
  /** The output that carries the uncertainty; absent when the outputs are words. */
  readonly mainOutput?: string;
  readonly formula: {
    /** In symbols: "3F(L − l) / 2bd²". */
    readonly symbols: string;
    /**
     * Template for these inputs: {load} the number with its unit, {load#} the number alone, {R@m} the length in metres.
     * Rendered by `formulaWithNumbers` in `wording/formula.ts`.
     */
    readonly template: (given: GivenInputs) => string;
  };
  readonly source: { readonly text: string; readonly tag: SourceTag };
  /** May throw OutsideDomain; called only by `evaluateMethod` and, draw by draw, by `drawMethods`. */
  readonly run: (given: GivenInputs) => Outputs;
  /** Change of the main output per unit of each uncertain input, by input name. Absent: no first-order uncertainty. */
  readonly sensitivities?: (given: GivenInputs) => Readonly<Record<string, number>>;
  readonly cautions: (given: GivenInputs, outputs: Outputs) => readonly Caution[];
};
