import { mirrorStressMPa } from '../mirror/mirror-stress.ts';
import { residualStressMPa } from '../mirror/residual-stress.ts';
import { residualStressSensitivities } from '../uncertainty/residual-stress-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

const mirror = (given: GivenInputs) => ({
  mirrorConstantMPaRootM: numberGiven(given, 'A'),
  radiusMm: numberGiven(given, 'R'),
  appliedStressMPa: numberGiven(given, 'appliedStress'),
});

export const mirrorResidual: Method = {
  id: 'mirror.residual',
  version: 1,
  line: 'supporting',
  title: 'Residual stress from the mirror',
  inputs: [
    { ...mirrorInputs.A, limits: 'more than 0; from stress-free material', uncertainty: 'expected' },
    { ...mirrorInputs.R, uncertainty: 'expected' },
    {
      ...mirrorInputs.stress,
      name: 'appliedStress',
      label: 'Applied stress at the origin',
      symbol: 'σₐ',
      argument: 'appliedStressMPa',
      limits: 'any; tension positive',
      uncertainty: 'expected',
    },
  ],
  outputs: [
    { name: 'mirrorStress', label: 'Total stress at the origin', symbol: 'σ', unit: 'MPa' },
    { name: 'residualStress', label: 'Residual stress, tension positive', symbol: 'σᵣ', unit: 'MPa' },
  ],
  mainOutput: 'residualStress',
  formula: { symbols: 'A / √R − σₐ', template: () => '{A} / √({R@m}) − {appliedStress}' },
  source: { text: 'Mirror relation for the total stress, σₐ + σᵣ = A/√R', tag: 're-derived' },
  run: (given) => ({
    mirrorStress: mirrorStressMPa(mirror(given)),
    residualStress: residualStressMPa(mirror(given)),
  }),
  sensitivities: (given) => residualStressSensitivities(mirror(given)),
  cautions: () => [],
};
