import { fitThroughOrigin } from '../mirror/fit-through-origin.ts';
import type { Method } from './method.ts';
import { lotInputs } from './mirror-inputs.ts';
import { mirrorLotCautions, mirrorLotGiven, mirrorsInWords } from './mirror-lot-given.ts';

export const mirrorFitOrigin: Method = {
  id: 'mirror.fit.origin',
  version: 1,
  line: 'supporting',
  title: 'Mirror constant of a lot, line through the origin',
  inputs: lotInputs(2),
  outputs: [
    { name: 'A', label: 'Mirror constant', symbol: 'A', unit: 'MPa√m' },
    { name: 'uA', label: 'Standard uncertainty of the constant', symbol: 'u(A)', unit: 'MPa√m' },
    { name: 'residualSd', label: 'Spread about the line', symbol: 's', unit: 'MPa' },
  ],
  mainOutput: 'A',
  formula: {
    symbols: 'Σ(σ/√R) / Σ(1/R)',
    template: (given) => `Σ(σ/√R) / Σ(1/R) over ${mirrorsInWords(given)}`,
  },
  source: { text: 'Least squares of σ on 1/√R', tag: 're-derived' },
  run: (given) => {
    const fit = fitThroughOrigin(mirrorLotGiven(given));
    return {
      A: fit.mirrorConstantMPaRootM,
      uA: fit.standardUncertaintyMPaRootM,
      residualSd: fit.residualSdMPa,
    };
  },
  cautions: mirrorLotCautions,
};
