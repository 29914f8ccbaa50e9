import { fitWithIntercept } from '../mirror/fit-with-intercept.ts';
import { studentTQuantile } from '../special-functions/student-t.ts';
import { listGiven } from './given.ts';
import type { Caution, GivenInputs, Method, Outputs } from './method.ts';
import { lotInputs } from './mirror-inputs.ts';
import { mirrorLotCautions, mirrorLotGiven, mirrorsInWords } from './mirror-lot-given.ts';

function cautions(given: GivenInputs, outputs: Outputs): Caution[] {
  const found = mirrorLotCautions(given);
  const degreesOfFreedom = listGiven(given, 'R').length - 2;
  const limit = studentTQuantile({ probability: 0.975, degreesOfFreedom });
  if (typeof outputs.t !== 'number' || Math.abs(outputs.t) < limit) return found;
  const sentence = `The intercept is not zero (|t| is ${Math.abs(outputs.t).toFixed(1)}, the limit ${limit.toFixed(2)}): suspect residual stress, a shifted boundary or gradient, and do not quote the constant of the line through the origin.`;
  return [...found, { code: 'intercept-not-zero', weight: 'warning', sentence }];
}

export const mirrorFitIntercept: Method = {
  id: 'mirror.fit.intercept',
  version: 1,
  line: 'supporting',
  title: 'Mirror constant and residual stress of a lot',
  inputs: lotInputs(3),
  outputs: [
    { name: 'A', label: 'Mirror constant', symbol: 'A', unit: 'MPa√m' },
    { name: 'uA', label: 'Standard uncertainty of the constant', symbol: 'u(A)', unit: 'MPa√m' },
    { name: 'intercept', label: 'Intercept', symbol: 'B', unit: 'MPa' },
    { name: 'uIntercept', label: 'Standard uncertainty of the intercept', symbol: 'u(B)', unit: 'MPa' },
    { name: 'residualStress', label: 'Residual stress, tension positive', symbol: 'σᵣ', unit: 'MPa' },
    { name: 't', label: 'Intercept over its uncertainty', symbol: 't', unit: '1' },
    { name: 'p', label: 'Chance of such an intercept without cause', symbol: 'p', unit: '1' },
  ],
  mainOutput: 'A',
  formula: { symbols: 'σ = A / √R + B', template: (given) => `σ = A / √R + B through ${mirrorsInWords(given)}` },
  source: { text: 'Ordinary least squares of σ on 1/√R', tag: 're-derived' },
  run: (given) => {
    const fit = fitWithIntercept(mirrorLotGiven(given));
    return {
      A: fit.mirrorConstantMPaRootM,
      uA: fit.uMirrorConstantMPaRootM,
      intercept: fit.interceptMPa,
      uIntercept: fit.uInterceptMPa,
      residualStress: fit.residualStressMPa,
      ...fit.test,
    };
  },
  cautions,
};
