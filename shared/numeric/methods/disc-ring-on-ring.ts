import { ringOnRingStressMPa } from '../bending/ring-on-ring-stress.ts';
import { ringOnRingSensitivities } from '../uncertainty/ring-on-ring-sensitivities.ts';
import { ringOnRingCautions } from './disc-cautions.ts';
import { ringOnRingGiven, ringOnRingInputs } from './ring-on-ring-inputs.ts';
import type { Method } from './method.ts';

export const discRingOnRing: Method = {
  id: 'disc.ringOnRing',
  version: 1,
  line: 'load',
  title: 'Disc between two rings, within the load ring on the tensile face',
  inputs: ringOnRingInputs,
  outputs: [{ name: 'stress', label: 'Stress within the load ring', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: {
    symbols: '3F / 2πh² · [(1 − ν)(Ds² − DL²) / 2D² + (1 + ν) ln(Ds/DL)]',
    template: () =>
      '3 × {load} / (2π × ({thickness})²) × [(1 − {poisson}) × ({supportDiameter#}² − {loadDiameter#}²) / (2 × {discDiameter#}²) + (1 + {poisson}) × ln({supportDiameter#} / {loadDiameter#})]',
  },
  source: {
    text: 'Form of ASTM C1499 (from memory), equal to the thin-plate solution with overhang',
    tag: 're-derived',
  },
  run: (given) => ({ stress: ringOnRingStressMPa(ringOnRingGiven(given)) }),
  sensitivities: (given) => ringOnRingSensitivities(ringOnRingGiven(given)),
  cautions: ringOnRingCautions,
};
