import { peakStressFactor } from '../thermal/peak-stress-factor.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { biotCautions, thermalInputs } from './thermal-inputs.ts';

export const thermalPsi: Method = {
  id: 'thermal.psi',
  version: 1,
  line: 'supporting',
  title: 'Part of the stress of instant cooling that a fluid reaches',
  inputs: [thermalInputs.biot],
  outputs: [{ name: 'psi', label: 'Part of the stress of instant cooling', symbol: 'ψ', unit: '1' }],
  mainOutput: 'psi',
  formula: {
    symbols: '1 / [1.5 + 3.25/Bi − 0.5 exp(−16/Bi)]',
    template: () => '1 / [1.5 + 3.25 / {biot} − 0.5 × exp(−16 / {biot})]',
  },
  source: {
    text: 'Fit within 5 % of the conduction series of the infinite plate for 0.1 ≤ Bi ≤ 50',
    tag: 'from memory',
  },
  run: (given) => ({ psi: peakStressFactor({ biotNumber: numberGiven(given, 'biot') }) }),
  cautions: (given) => biotCautions(numberGiven(given, 'biot')),
};
