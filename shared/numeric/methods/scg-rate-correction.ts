import { rateCorrectedStressMPa } from '../slow-growth/rate-corrected-stress.ts';
import { rateCorrectedSensitivities } from '../uncertainty/rate-corrected-sensitivities.ts';
import { numberGiven } from './given.ts';
import { growthInputs } from './growth-inputs.ts';
import type { GivenInputs, Method } from './method.ts';

const change = (given: GivenInputs) => ({
  stressMPa: numberGiven(given, 'stress'),
  rateMPaPerS: numberGiven(given, 'rate'),
  targetRateMPaPerS: numberGiven(given, 'targetRate'),
  exponent: numberGiven(given, 'n'),
});

export const scgRateCorrection: Method = {
  id: 'scg.rateCorrection',
  version: 1,
  line: 'supporting',
  title: 'Fracture stress at another stress rate',
  inputs: [
    { ...growthInputs.stress, uncertainty: 'expected' },
    { ...growthInputs.rate, label: 'Stress rate as tested', uncertainty: 'expected' },
    { ...growthInputs.targetRate, uncertainty: 'expected' },
    { ...growthInputs.exponent, uncertainty: 'expected' },
  ],
  outputs: [{ name: 'stress', label: 'Fracture stress at that rate', symbol: 'σ₂', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: {
    symbols: 'σ₁(σ̇₂/σ̇₁)^(1/(n + 1))',
    template: () => '{stress} × ({targetRate} / {rate})^(1 / ({n} + 1))',
  },
  source: { text: 'Power law of slow crack growth, form of ASTM C1368', tag: 'from memory' },
  run: (given) => ({ stress: rateCorrectedStressMPa(change(given)) }),
  sensitivities: (given) => rateCorrectedSensitivities(change(given)),
  cautions: () => [],
};
