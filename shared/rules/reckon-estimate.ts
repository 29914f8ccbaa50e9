import { runMethod } from '../numeric/evaluate-method.ts';
import { findMethod } from '../numeric/methods.ts';
import type { Caution, GivenInputs, Method, Outputs } from '../numeric/methods/method.ts';
import type { Estimated } from '../numeric/uncertainty/estimated.ts';
import type { Budget } from '../numeric/uncertainty/propagate.ts';
import type { OurUnit } from '../numeric/units/our-units.ts';
import type { RefusalCode } from '../numeric/refusal-codes.ts';
import { estimateLines, type EstimateLine } from '../vocabulary/estimate-lines.ts';

/** One number that came out. A stress always carries its standard uncertainty; plain ratios carry none. */
export type EstimateOutput = {
  readonly name: string;
  readonly label: string;
  readonly symbol: string;
  readonly value: number;
  readonly standardUncertainty: number | null;
  readonly unit: OurUnit;
};

export type EstimateReckoned = {
  readonly kind: 'value';
  readonly line: EstimateLine;
  /** Stress at the origin, MPa. */
  readonly origin: Estimated;
  readonly outputs: readonly EstimateOutput[];
  readonly budget: Budget;
  readonly cautions: readonly Caution[];
};
/** `field` is the name of an input, `label` what it is called on forms; worded by `refusalInWords`. */
export type EstimateRefused = {
  readonly kind: 'refused';
  readonly code: RefusalCode;
  readonly field: string;
  readonly label: string;
};

/** The method that gives the stress on the tensile face from the same bar. */
const outerFibreMethod: Readonly<Record<string, string>> = {
  'bend3.rect.local': 'bend3.rect',
  'bend4.rect.local': 'bend4.rect',
};

/**
 * Reckons the stress at the origin by one version of a method from inputs in our units, with its interval, its budget and
 * its cautions. In a bent bar the stress on the tensile face and the stress at the origin come under two names.
 * Refuses, by input, whatever the method refuses, and an uncertainty that is not stated or nothing at all.
 */
export function reckonEstimate(method: Method, given: GivenInputs): EstimateReckoned | EstimateRefused {
  const answer = runMethod(method, given);
  if (answer.kind === 'refused') return refusedBy(method, answer.code, answer.field);
  const [missing] = answer.uncertaintyNotStated;
  if (missing !== undefined) return refusedBy(method, 'missing-uncertainty', missing);
  const line = estimateLines.find((each) => each === method.line);
  if (!line || !answer.estimated) return refusedBy(method, 'unknown-method', method.id);
  if (answer.estimated.standardUncertainty === 0) {
    const [first] = method.inputs;
    return refusedBy(method, 'missing-uncertainty', first?.name ?? 'method');
  }
  const { estimated: origin, budget, cautions } = answer;
  return { kind: 'value', line, origin, outputs: outputsOf(method, given, answer.outputs, origin), budget, cautions };
}

function outputsOf(method: Method, given: GivenInputs, outputs: Outputs, origin: Estimated): EstimateOutput[] {
  const ratios = method.outputs.flatMap((output): EstimateOutput[] => {
    const value = outputs[output.name];
    if (typeof value !== 'number' || output.unit !== '1') return [];
    const { name, label, symbol, unit } = output;
    return [{ name, label, symbol, value, standardUncertainty: null, unit }];
  });
  const atOrigin = stressOutput('originStress', 'Stress at the origin', 'σ', origin);
  const outerFibre = outerFibreStress(method, given, origin);
  return outerFibre
    ? [stressOutput('outerFibreStress', 'Nominal stress on the tensile face', 'σ₀', outerFibre), ...ratios, atOrigin]
    : [...ratios, atOrigin];
}

/** For a bar the stress on its tensile face; nothing for a method that knows no face. */
function outerFibreStress(method: Method, given: GivenInputs, origin: Estimated): Estimated | null {
  if (Object.values(outerFibreMethod).includes(method.id)) return origin;
  const face = findMethod(outerFibreMethod[method.id] ?? '', method.version);
  if (!face) return null;
  const names = new Set(face.inputs.map((input) => input.name));
  const answer = runMethod(face, Object.fromEntries(Object.entries(given).filter(([name]) => names.has(name))));
  return answer.kind === 'value' ? answer.estimated : null;
}

function stressOutput(name: string, label: string, symbol: string, stress: Estimated): EstimateOutput {
  return { name, label, symbol, ...stress };
}

function refusedBy(method: Method, code: RefusalCode, field: string): EstimateRefused {
  const label = method.inputs.find((input) => input.name === field)?.label ?? field;
  return { kind: 'refused', code, field, label };
}
