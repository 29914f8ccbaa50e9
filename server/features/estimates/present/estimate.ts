import { z } from 'zod';
import {
  BudgetView,
  CautionView,
  OutputView,
  type EstimateStaleView,
  type EstimateView,
} from '#shared/contracts/estimates.ts';
import { findMethod } from '#shared/numeric/methods.ts';
import type { Method } from '#shared/numeric/methods/method.ts';
import { formulaWithNumbers } from '#shared/wording/formula.ts';
import { coverageFactor, formatQuantity } from '#shared/wording/quantity.ts';
import type { EstimateRow } from '../queries/estimates.ts';
import type { InputRow } from '../queries/inputs.ts';
import type { StalenessRow } from '../queries/staleness.ts';
import { givenFrom } from '../service/resolved-input.ts';
import { presentInput, unitOf, type InputSourcesFound } from './inputs.ts';
import { presentSources } from './sources.ts';
import { presentStress } from './stress.ts';

/** An estimate with all that is shown beside it. */
export type EstimateFound = {
  readonly caseNumber: string;
  readonly row: EstimateRow;
  readonly inputs: readonly InputRow[];
  readonly found: InputSourcesFound;
  /** Open and settled, of this estimate. */
  readonly staleness: readonly StalenessRow[];
  readonly isCompared: boolean;
  readonly stale: EstimateStaleView | null;
};

/** An estimate as its page, a bound value and the seal read it. */
export function presentEstimate(estimate: EstimateFound): EstimateView {
  const { row, found, caseNumber, staleness } = estimate;
  const method = methodOf(row);
  const staleIds = new Set(staleness.filter((each) => each.settledAt === null).map((each) => each.causeId));
  const order = (name: string) => method.inputs.findIndex((input) => input.name === name);
  const inputs = [...estimate.inputs]
    .sort((one, other) => order(one.name) - order(other.name))
    .map((input) => presentInput(method, input, found, staleIds));
  return {
    id: row.id,
    number: row.number,
    line: row.line,
    method: presentMethod(method),
    origin: presentStress(row.stressMPa, row.standardUncertaintyMPa),
    outputs: presentOutputs(row.outputs),
    inputs,
    formula: formulaOf(method, estimate),
    budget: presentBudget(method, row.budget),
    cautions: z.array(CautionView).parse(row.cautions),
    sources: presentSources(inputs, { caseNumber, found, stale: staleIds }),
    supersedesId: row.supersedesId,
    supersededById: row.supersededById,
    standing: presentStanding(row),
    isCompared: estimate.isCompared,
    stale: estimate.stale,
    kept: staleness.flatMap(({ settlement, why, reason, settledAt }) =>
      settlement === 'kept' && settledAt ? [{ why, reason: reason ?? '', at: settledAt.toISOString() }] : [],
    ),
    remark: row.remark,
    madeBy: { id: row.madeBy, name: row.madeByName },
    madeAt: row.madeAt.toISOString(),
  };
}

/** The method version an estimate was made by; every version stays runnable. */
export function methodOf(row: Pick<EstimateRow, 'method' | 'methodVersion'>): Method {
  const method = findMethod(row.method, row.methodVersion);
  if (!method) throw new Error(`method ${row.method} version ${row.methodVersion} is gone from the table of methods`);
  return method;
}

function presentMethod({ id, version, title, formula, source }: Method): EstimateView['method'] {
  return { id, version, title, symbols: formula.symbols, source: source.text, sourceTag: source.tag };
}

function presentStanding(row: EstimateRow): EstimateView['standing'] {
  if (row.standing === null || row.standingBy === null || row.standingAt === null) {
    return { standing: 'in use', reason: '', by: null, at: null };
  }
  return {
    standing: row.standing,
    reason: row.standingReason ?? '',
    by: { id: row.standingBy, name: row.standingByName ?? '' },
    at: row.standingAt.toISOString(),
  };
}

function presentOutputs(stored: unknown): EstimateView['outputs'] {
  return z
    .array(OutputView.omit({ expandedUncertainty: true }))
    .parse(stored)
    .map((output) => ({
      ...output,
      expandedUncertainty: output.standardUncertainty === null ? null : coverageFactor * output.standardUncertainty,
    }));
}

function presentBudget(method: Method, stored: unknown): EstimateView['budget'] {
  const rows = z.array(BudgetView.omit({ label: true, symbol: true, plusMinus: true })).parse(stored);
  return rows.map((row) => {
    const input = method.inputs.find((each) => each.name === row.input);
    return {
      ...row,
      label: input?.label ?? row.input,
      symbol: input && input.kind !== 'code' ? input.symbol : row.input,
      plusMinus: plusMinusOf(method, row),
    };
  });
}

/** ± of an input alone, k = 2, to two figures, in the unit a length of that size is shown in. */
function plusMinusOf(method: Method, row: { input: string; standardUncertainty: number }): string {
  const expanded = { value: coverageFactor * row.standardUncertainty, unit: unitOf(method, row.input) };
  return `±\u00A0${formatQuantity(expanded, { significantFigures: 2 })}`;
}

function formulaOf(method: Method, { row, inputs }: EstimateFound): string {
  const typed = inputs.flatMap(({ name, enteredText, enteredUnit, unit }): [string, string][] => {
    const [number] = /^\d+(\.\d+)?/.exec(enteredText ?? '') ?? [];
    return number !== undefined && enteredUnit === unit ? [[name, number]] : [];
  });
  const { text: result } = presentStress(row.stressMPa, row.standardUncertaintyMPa);
  return formulaWithNumbers(method, { given: givenFrom(inputs), typed: Object.fromEntries(typed), result });
}
