import { meanConstant } from '../mirror/mean-constant.ts';
import type { Method } from './method.ts';
import { lotInputs } from './mirror-inputs.ts';
import { mirrorLotCautions, mirrorLotGiven, mirrorsInWords } from './mirror-lot-given.ts';

export const mirrorFitMean: Method = {
  id: 'mirror.fit.mean',
  version: 1,
  line: 'supporting',
  title: 'Mirror constant of a lot, mean of the single ones',
  inputs: lotInputs(2),
  outputs: [
    { name: 'A', label: 'Mirror constant, arithmetic mean', symbol: 'A', unit: 'MPa√m' },
    { name: 'sd', label: 'Spread of the single constants', symbol: 's', unit: 'MPa√m' },
    { name: 'uA', label: 'Standard uncertainty of the mean', symbol: 'u(A)', unit: 'MPa√m' },
    { name: 'geometricMean', label: 'Mirror constant, geometric mean', symbol: 'A₀', unit: 'MPa√m' },
  ],
  mainOutput: 'A',
  formula: { symbols: 'Σσ√R / n', template: (given) => `Σσ√R / n over ${mirrorsInWords(given)}` },
  source: { text: 'Mean and standard deviation of σ√R', tag: 're-derived' },
  run: (given) => {
    const mean = meanConstant(mirrorLotGiven(given));
    return {
      A: mean.meanMPaRootM,
      sd: mean.sdMPaRootM,
      uA: mean.standardUncertaintyMPaRootM,
      geometricMean: mean.geometricMeanMPaRootM,
    };
  },
  cautions: mirrorLotCautions,
};
