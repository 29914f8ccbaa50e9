import { pistonOnThreeBallsStress } from '../bending/piston-on-three-balls-stress.ts';
import { pistonOnThreeBallsSensitivities } from '../uncertainty/piston-on-three-balls-sensitivities.ts';
import { sectionCautions } from './bar-cautions.ts';
import type { Method } from './method.ts';
import { pistonGiven, pistonInputs } from './piston-inputs.ts';

export const discPistonOnThreeBalls: Method = {
  id: 'disc.pistonOnThreeBalls',
  version: 1,
  line: 'load',
  title: 'Disc on three balls under a piston, at the centre of the tensile face',
  inputs: pistonInputs,
  outputs: [
    { name: 'X', label: 'Number X of the printed formula', symbol: 'X', unit: '1' },
    { name: 'Y', label: 'Number Y of the printed formula', symbol: 'Y', unit: '1' },
    { name: 'stress', label: 'Stress at the centre of the tensile face', symbol: 'σ', unit: 'MPa' },
  ],
  mainOutput: 'stress',
  formula: {
    symbols:
      '−0.2387F(X − Y) / h², X = (1 + ν) ln(r₂/r₃)² + ½(1 − ν)(r₂/r₃)², Y = (1 + ν)[1 + ln(r₁/r₃)²] + (1 − ν)(r₁/r₃)²',
    template: () => '−0.2387 × {load} × (X − Y) / ({thickness})²',
  },
  source: { text: 'ISO 6872 (from memory); plate theory gives the same within 0.014 %', tag: 'from memory' },
  run: (given) => {
    const { stressMPa, x, y } = pistonOnThreeBallsStress(pistonGiven(given));
    return { X: x, Y: y, stress: stressMPa };
  },
  sensitivities: (given) => pistonOnThreeBallsSensitivities(pistonGiven(given)),
  cautions: sectionCautions,
};
