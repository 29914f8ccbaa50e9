import { evaluateMethod } from '#shared/numeric/evaluate-method.ts';
import { findCurrentMethod, methods } from '#shared/numeric/methods.ts';
import type { GivenInputs } from '#shared/numeric/methods/method.ts';
import { numberIn, type CheckValue } from './check-values.ts';

type Inputs = CheckValue['inputs'];
export type Answer = Readonly<Record<string, unknown>>;

/** How each reference method is run: those of the table by the table, the rest by the code that holds them. */
export const runners: Readonly<Record<string, (inputs: Inputs) => Answer>> = {
  ...Object.fromEntries(methods.map(({ id }) => [id, (inputs: Inputs) => answerOf(id, givenFrom(inputs, id))])),
  'uncertainty.bend3.local': (inputs) => answerOf('bend3.rect.local', givenFrom(inputs, 'bend3.rect.local')),
  'uncertainty.bend4.nominal': (inputs) => answerOf('bend4.rect', givenFrom(inputs, 'bend4.rect')),
  'uncertainty.flaw': (inputs) => answerOf('flaw.stress', givenFrom(inputs, 'flaw.stress')),
  'uncertainty.ringOnRing': (inputs) => answerOf('disc.ringOnRing', exactly(givenFrom(inputs, 'disc.ringOnRing'))),
  'load.given': (inputs) => answerOf('load.given', givenStress(inputs)),
};

/**
 * Inputs with the uncertainty beside each, spelled u_load or uA, unless the method has an input of that name itself; words
 * are codes, and an infinite width is left out.
 */
function givenFrom(inputs: Inputs, id: string): GivenInputs {
  const own = new Set(findCurrentMethod(id)?.inputs.map((input) => input.name));
  const uncertaintyOf = (name: string) =>
    [`u_${name}`, `u${name}`].find((spelled) => spelled in inputs && !own.has(spelled));
  const uncertainties = new Set(Object.keys(inputs).map(uncertaintyOf));
  return Object.fromEntries(
    Object.entries(inputs)
      .filter(([name, { value }]) => !uncertainties.has(name) && value !== 'infinite')
      .map(([name, { value }]): [string, GivenInputs[string]] => {
        if (typeof value === 'string') return [name, { code: value }];
        if (Array.isArray(value)) return [name, { values: value.map((each) => each ?? Number.NaN) }];
        const spelled = uncertaintyOf(name);
        const stated = spelled === undefined ? {} : { standardUncertainty: numberIn(inputs, spelled) };
        return [name, { value: numberIn(inputs, name), ...stated }];
      }),
  );
}

/** The same inputs, each stated to be exact, so that the sensitivities are given. */
function exactly(given: GivenInputs): GivenInputs {
  return Object.fromEntries(
    Object.entries(given).map(([name, input]) => [
      name,
      'value' in input ? { ...input, standardUncertainty: 0 } : input,
    ]),
  );
}

/** The stress with its uncertainty, which the method takes as one input and the reference spells as two. */
function givenStress(inputs: Inputs): GivenInputs {
  const stated = 'uStress' in inputs ? { standardUncertainty: numberIn(inputs, 'uStress') } : {};
  return { stress: { value: numberIn(inputs, 'stress'), ...stated } };
}

function answerOf(id: string, given: GivenInputs): Answer {
  const answer = evaluateMethod(id, 1, given);
  if (answer.kind === 'refused') return { refusal: answer.code };
  const { outputs, estimated, budget } = answer;
  if (!estimated) return outputs;
  const sensitivities = Object.fromEntries(budget.map((row) => [`c_${row.input}`, row.sensitivity]));
  const relativeUncertainty = estimated.standardUncertainty / estimated.value;
  return { ...outputs, ...sensitivities, uStress: estimated.standardUncertainty, relativeUncertainty };
}
