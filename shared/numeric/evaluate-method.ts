import type { RefusalCode } from './refusal-codes.ts';
import { findMethod } from './methods.ts';
import { uncertaintyGiven } from './methods/given.ts';
import type { Caution, GivenInputs, Method, MethodInput, Outputs } from './methods/method.ts';
import { OutsideDomain } from './outside-domain.ts';
import { requireFinite, requireNotNegative, requireThat } from './require.ts';
import type { Estimated } from './uncertainty/estimated.ts';
import { propagateUncertainty, type Budget, type UncertainTerm } from './uncertainty/propagate.ts';

export type MethodValue = {
  readonly kind: 'value';
  readonly outputs: Outputs;
  /** The main output with its uncertainty; `null` while an expected uncertainty is not stated. */
  readonly estimated: Estimated | null;
  readonly budget: Budget;
  /** Inputs whose uncertainty is expected but not stated. */
  readonly uncertaintyNotStated: readonly string[];
  readonly cautions: readonly Caution[];
};
/** `field` is the name of the input that is wrong (or of the method, when it is unknown). */
export type MethodRefused = { readonly kind: 'refused'; readonly code: RefusalCode; readonly field: string };

/**
 * Runs one version of a method on inputs in our units. The one way in: it never throws for what was entered.
 *
 * Gives `outputs` whenever the formula holds, and `estimated` with its budget when every input that should carry an
 * uncertainty does. Refuses with the first reason that applies, in the order finite, dimensions, spans, load, position.
 */
export function evaluateMethod(id: string, version: number, given: GivenInputs): MethodValue | MethodRefused {
  const method = findMethod(id, version);
  if (!method) return { kind: 'refused', code: 'unknown-method', field: id };
  return runMethod(method, given);
}

/** As `evaluateMethod`, for a method already in hand. */
export function runMethod(method: Method, given: GivenInputs): MethodValue | MethodRefused {
  try {
    return valueOf(method, withDefaults(method, given));
  } catch (refusal) {
    if (!(refusal instanceof OutsideDomain)) throw refusal;
    return { kind: 'refused', code: refusal.code, field: inputNameOf(method, refusal.field) };
  }
}

function valueOf(method: Method, given: GivenInputs): MethodValue {
  requireKnownInputs(method, given);
  const outputs = method.run(given);
  requireFiniteOutputs(outputs);
  requireSoundOptionals(method, given);
  requireSoundUncertainties(given);
  const uncertaintyNotStated = method.inputs
    .filter((input) => isUncertain(input) && uncertaintyGiven(given, input.name) === undefined)
    .map((input) => input.name);
  const { estimated, budget } =
    uncertaintyNotStated.length > 0 ? { estimated: null, budget: [] } : estimateOf(method, given, outputs);
  return { kind: 'value', outputs, estimated, budget, uncertaintyNotStated, cautions: method.cautions(given, outputs) };
}

function estimateOf(
  method: Method,
  given: GivenInputs,
  outputs: Outputs,
): { estimated: Estimated | null; budget: Budget } {
  const output = method.outputs.find((each) => each.name === method.mainOutput);
  const value = output && outputs[output.name];
  if (!method.sensitivities || !output?.unit || typeof value !== 'number') return { estimated: null, budget: [] };
  const sensitivities = method.sensitivities(given);
  const terms: UncertainTerm[] = method.inputs.flatMap((input) => {
    const sensitivity = sensitivities[input.name];
    const standardUncertainty = uncertaintyGiven(given, input.name);
    if (sensitivity === undefined || standardUncertainty === undefined) return [];
    return [{ input: input.name, sensitivity, standardUncertainty }];
  });
  return propagateUncertainty({ value, unit: output.unit, terms });
}

function isUncertain(input: MethodInput): boolean {
  return input.kind === 'number' && input.uncertainty === 'expected' && !input.optional;
}

function withDefaults(method: Method, given: GivenInputs): GivenInputs {
  const defaults = method.inputs.flatMap((input): [string, GivenInputs[string]][] => {
    if (given[input.name] !== undefined || !('default' in input) || input.default === undefined) return [];
    const value = input.default;
    return [[input.name, typeof value === 'number' ? { value, standardUncertainty: 0 } : { code: value }]];
  });
  return { ...given, ...Object.fromEntries(defaults) };
}

function requireKnownInputs(method: Method, given: GivenInputs): void {
  const known = new Set(method.inputs.map((input) => input.name));
  for (const name of Object.keys(given)) requireThat(known.has(name), 'unknown-input', name);
}

/** The formula never sees the optional numbers that only serve a remark, so they are checked here: finite and > 0. */
function requireSoundOptionals(method: Method, given: GivenInputs): void {
  for (const input of method.inputs) {
    const entry = given[input.name];
    if (input.kind !== 'number' || !input.optional || !entry || !('value' in entry)) continue;
    requireFinite({ [input.name]: entry.value });
    if (input.unitKind === 'length') requireThat(entry.value > 0, 'non-positive-dimension', input.name);
  }
}

function requireSoundUncertainties(given: GivenInputs): void {
  for (const name of Object.keys(given)) {
    const standardUncertainty = uncertaintyGiven(given, name);
    if (standardUncertainty === undefined) continue;
    requireFinite({ [name]: standardUncertainty });
    requireNotNegative({ [name]: standardUncertainty }, 'negative-uncertainty');
  }
}

/** Inputs each sound but together beyond what a number can hold (a depth of 1e-200 mm). */
function requireFiniteOutputs(outputs: Outputs): void {
  for (const [name, value] of Object.entries(outputs)) {
    requireThat(typeof value !== 'number' || Number.isFinite(value), 'outside-validity-range', name);
  }
}

function inputNameOf(method: Method, field: string): string {
  const input = method.inputs.find((each) => each.kind !== 'code' && each.argument === field);
  return input?.name ?? field;
}
