import type { Reckoning, ReckoningWanted } from '../contracts/reckonings.ts';
import { runMethod, type MethodRefused, type MethodValue } from '../numeric/evaluate-method.ts';
import { findCurrentMethod } from '../numeric/methods.ts';
import type { GivenInputs, Method } from '../numeric/methods/method.ts';
import { OutsideDomain } from '../numeric/outside-domain.ts';
import { drawListed } from './draw-listed.ts';
import { givenFromListed } from './reckoning-inputs.ts';
import { plainRate, plainUnit } from './reckoning-units.ts';

/** Names under which the uncertainty of a method is asked for; inputs without one are taken as exact. */
const uncertaintyOf: Readonly<Record<string, string>> = {
  'uncertainty.bend3.local': 'bend3.rect.local',
  'uncertainty.bend4.nominal': 'bend4.rect',
  'uncertainty.flaw': 'flaw.stress',
  'uncertainty.ringOnRing': 'disc.ringOnRing',
};
const monteCarlo = 'montecarlo.';
const drawnMethods: Readonly<Record<string, string>> = { mirror: 'mirror.stress', flaw: 'flaw.stress' };

type ListedOutputs = Extract<Reckoning, { outputs: unknown }>['outputs'];

/** Whether an id asks for the Monte Carlo of a method. */
export function isMonteCarlo(id: string): boolean {
  return id.startsWith(monteCarlo);
}

/** The method that an id stands for, in its newest version, or nothing. */
export function methodOfListed(id: string): Method | undefined {
  if (!isMonteCarlo(id)) return findCurrentMethod(uncertaintyOf[id] ?? id);
  const drawn = id.slice(monteCarlo.length);
  return findCurrentMethod(drawnMethods[drawn] ?? drawn);
}

/**
 * Reckons one listed method: any of the table, the uncertainty of some by names of their own, and `montecarlo.` before any
 * id for its Monte Carlo. Never throws for what was listed. `mostDraws`: refused above.
 */
export function reckonListed(wanted: ReckoningWanted, { mostDraws = 1_000_000 } = {}): Reckoning {
  const { id, method: methodId, inputs } = wanted;
  const method = methodOfListed(methodId);
  if (!method) return { id, refused: 'unknown-method', field: methodId };
  try {
    if (isMonteCarlo(methodId)) return drawListed(method, wanted, mostDraws);
    const given = givenFromListed(method, inputs);
    const answer = runMethod(method, methodId in uncertaintyOf ? withUncertainties(given) : given);
    return answer.kind === 'refused' ? refused(id, answer) : valued(id, method, answer);
  } catch (refusal) {
    if (refusal instanceof OutsideDomain) return refused(id, refusal);
    throw refusal;
  }
}

function refused(id: string, { code, field }: Pick<MethodRefused, 'code' | 'field'>): Reckoning {
  return { id, refused: code, field };
}

function withUncertainties(given: GivenInputs): GivenInputs {
  return Object.fromEntries(
    Object.entries(given).map(([name, input]) => [
      name,
      'value' in input ? { ...input, standardUncertainty: input.standardUncertainty ?? 0 } : input,
    ]),
  );
}

function valued(id: string, method: Method, answer: MethodValue): Reckoning {
  const outputs: ListedOutputs = {};
  for (const { name, unit } of method.outputs) {
    const value = answer.outputs[name];
    if (value === undefined) continue;
    outputs[name] = { value: typeof value === 'object' ? [...value] : value, unit: plainUnit(unit, value) };
  }
  return { id, outputs: { ...outputs, ...uncertaintyOutputs(method, answer) }, cautions: [...answer.cautions] };
}

/** u, u relative, and c_load and the like: how much of the main output per one of each input. */
function uncertaintyOutputs(method: Method, { estimated, budget }: MethodValue): ListedOutputs {
  if (!estimated) return {};
  const { value, standardUncertainty, unit } = estimated;
  const outputs: ListedOutputs = { uStress: { value: standardUncertainty, unit: plainUnit(unit, 0) } };
  if (value !== 0) outputs.relativeUncertainty = { value: standardUncertainty / Math.abs(value), unit: '1' };
  for (const { input, sensitivity } of budget) {
    const described = method.inputs.find((each) => each.name === input);
    if (!described || described.kind === 'code') continue;
    outputs[`c_${input}`] = { value: sensitivity, unit: plainRate(unit, described.unit) };
  }
  return outputs;
}
