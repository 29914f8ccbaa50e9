import { constantRateStrength } from '../slow-growth/constant-rate-strength.ts';
import { numberGiven } from './given.ts';
import { growthInputs } from './growth-inputs.ts';
import type { Method } from './method.ts';

export const scgFullConstantRate: Method = {
  id: 'scg.fullConstantRate',
  version: 1,
  line: 'supporting',
  title: 'Fracture stress at a constant rate with slow crack growth',
  inputs: [growthInputs.inertStrength, growthInputs.growthConstant, growthInputs.exponent, growthInputs.rate],
  outputs: [
    { name: 'stress', label: 'Fracture stress at that rate', symbol: 'σ', unit: 'MPa' },
    { name: 'apparentToughnessRatio', label: 'Apparent over true toughness', symbol: 'Kapp/KIc', unit: '1' },
    { name: 'flawGrowthRatio', label: 'Last over first flaw size', symbol: 'cf/ci', unit: '1' },
  ],
  mainOutput: 'stress',
  formula: {
    symbols: 'σ^(n+1) = B(n + 1)σ̇(Si^(n−2) − σ^(n−2))',
    template: () => 'σ^({n} + 1) = {B} × ({n} + 1) × {rate} × (({inertStrength})^({n} − 2) − σ^({n} − 2))',
  },
  source: { text: 'Power law integrated at a constant rate, checked by direct integration', tag: 're-derived' },
  run: (given) => {
    const { stressMPa, apparentToughnessRatio, flawGrowthRatio } = constantRateStrength({
      inertStrengthMPa: numberGiven(given, 'inertStrength'),
      growthConstantMPa2S: numberGiven(given, 'B'),
      exponent: numberGiven(given, 'n'),
      rateMPaPerS: numberGiven(given, 'rate'),
    });
    return { stress: stressMPa, apparentToughnessRatio, flawGrowthRatio };
  },
  cautions: () => [],
};
