import { evaluateMethod } from '#shared/numeric/evaluate-method.ts';
import { findCurrentMethod, methods } from '#shared/numeric/methods.ts';
import type { GivenInputs } from '#shared/numeric/methods/method.ts';
import { OutsideDomain } from '#shared/numeric/outside-domain.ts';
import type { EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { judgeAgreement, judgePair, type LineReading } from '#shared/rules/agreement.ts';
import type { AgreementPattern } from '#shared/rules/agreement-pattern.ts';
import { numberIn, type CheckValue } from './check-values.ts';

type Inputs = CheckValue['inputs'];
export type Answer = Readonly<Record<string, unknown>>;

/** How each reference method is run: those of the table by the table, the rest by the code that holds them. */
export const runners: Readonly<Record<string, (inputs: Inputs) => Answer>> = {
  ...Object.fromEntries(methods.map(({ id }) => [id, (inputs: Inputs) => answerOf(id, givenFrom(inputs, id))])),
  'uncertainty.bend3.local': (inputs) => answerOf('bend3.rect.local', givenFrom(inputs, 'bend3.rect.local')),
  'uncertainty.bend4.nominal': (inputs) => answerOf('bend4.rect', givenFrom(inputs, 'bend4.rect')),
  'uncertainty.flaw': (inputs) => answerOf('flaw.stress', givenFrom(inputs, 'flaw.stress')),
  'compare.pair': comparedPair,
  'compare.pair.correlated': comparedPair,
  'compare.triple': comparedTriple,
};

/** Inputs with the uncertainty beside each, spelled u_load or uA, unless the method has an input of that name itself. */
function givenFrom(inputs: Inputs, id: string): GivenInputs {
  const own = new Set(findCurrentMethod(id)?.inputs.map((input) => input.name));
  const uncertaintyOf = (name: string) =>
    [`u_${name}`, `u${name}`].find((spelled) => spelled in inputs && !own.has(spelled));
  const uncertainties = new Set(Object.keys(inputs).map(uncertaintyOf));
  return Object.fromEntries(
    Object.entries(inputs)
      .filter(([name]) => !uncertainties.has(name))
      .map(([name, { value }]): [string, GivenInputs[string]] => {
        if (typeof value === 'string') return [name, { code: value }];
        if (Array.isArray(value)) return [name, { values: value.map((each) => each ?? Number.NaN) }];
        const spelled = uncertaintyOf(name);
        const stated = spelled === undefined ? {} : { standardUncertainty: numberIn(inputs, spelled) };
        return [name, { value: numberIn(inputs, name), ...stated }];
      }),
  );
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

function comparedPair(inputs: Inputs): Answer {
  try {
    const { zeta, en, verdict } = judgePair({
      stress1MPa: numberIn(inputs, 'stress1'),
      u1MPa: numberIn(inputs, 'u1'),
      stress2MPa: numberIn(inputs, 'stress2'),
      u2MPa: numberIn(inputs, 'u2'),
      covarianceMPa2: 'covariance' in inputs ? numberIn(inputs, 'covariance') : 0,
    });
    return { zeta, En: en, verdict };
  } catch (refusal) {
    if (refusal instanceof OutsideDomain) return { refusal: refusal.code };
    throw refusal;
  }
}

function comparedTriple(inputs: Inputs): Answer {
  const reading = (line: EstimateLine, stress: string, uncertainty: string): LineReading => ({
    line,
    stressMPa: numberIn(inputs, stress),
    standardUncertaintyMPa: numberIn(inputs, uncertainty),
    setAside: false,
    shared: [],
  });
  const agreement = judgeAgreement([
    reading('load', 'loadStress', 'uLoad'),
    reading('mirror', 'mirrorStress', 'uMirror'),
    reading('flaw', 'flawStress', 'uFlaw'),
  ]);
  const [loadMirror, loadFlaw, mirrorFlaw] = agreement.pairs;
  return {
    zetaLoadMirror: loadMirror?.zeta,
    zetaLoadFlaw: loadFlaw?.zeta,
    zetaMirrorFlaw: mirrorFlaw?.zeta,
    chi2: agreement.chiSquared,
    pattern: agreement.pattern && patternCode(agreement.pattern),
    pooledStress: agreement.pooled?.stressMPa,
    uPooled: agreement.pooled?.standardUncertaintyMPa,
  };
}

function patternCode(pattern: AgreementPattern): string {
  return pattern.kind === 'outlier' ? `${pattern.line}-${pattern.side}` : pattern.kind;
}
