import { mirrorStressMPa } from '../mirror/mirror-stress.ts';
import { relativeMirrorUncertainty } from '../mirror/mirror-uncertainty.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

const mirror = (given: GivenInputs) => ({
  mirrorConstantMPaRootM: numberGiven(given, 'A'),
  uMirrorConstantMPaRootM: numberGiven(given, 'uA'),
  radiusMm: numberGiven(given, 'R'),
  uRadiusMm: numberGiven(given, 'uR'),
});

export const mirrorUncertainty: Method = {
  id: 'mirror.uncertainty',
  version: 1,
  line: 'supporting',
  title: 'Uncertainty of a mirror stress',
  inputs: [
    mirrorInputs.A,
    {
      ...mirrorInputs.A,
      name: 'uA',
      label: 'Standard uncertainty of the constant',
      symbol: 'u(A)',
      argument: 'uMirrorConstantMPaRootM',
      limits: '0 or more',
    },
    mirrorInputs.R,
    {
      ...mirrorInputs.R,
      name: 'uR',
      label: 'Standard uncertainty of the radius',
      symbol: 'u(R)',
      argument: 'uRadiusMm',
      limits: '0 or more',
    },
  ],
  outputs: [
    { name: 'stress', label: 'Total stress at the origin', symbol: 'σ', unit: 'MPa' },
    { name: 'relativeUncertainty', label: 'Relative standard uncertainty', symbol: 'u(σ)/σ', unit: '1' },
  ],
  mainOutput: 'relativeUncertainty',
  formula: {
    symbols: '√((u(A)/A)² + (u(R)/2R)²)',
    template: () => '√(({uA#} / {A#})² + ({uR#} / (2 × {R#}))²)',
  },
  source: { text: 'JCGM 100:2008, 5.1.2, on σ = A/√R', tag: 're-derived' },
  run: (given) => ({
    stress: mirrorStressMPa(mirror(given)),
    relativeUncertainty: relativeMirrorUncertainty(mirror(given)),
  }),
  cautions: () => [],
};
