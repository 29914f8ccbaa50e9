import { cantileverRodStressMPa } from '../bending/cantilever-rod-stress.ts';
import { cantileverRodSensitivities } from '../uncertainty/cantilever-rod-sensitivities.ts';
import { sectionCautions } from './bar-cautions.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method, NumberInput } from './method.ts';
import { rodInputs } from './rod-inputs.ts';

const rod = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  armMm: numberGiven(given, 'arm'),
  diameterMm: numberGiven(given, 'diameter'),
});

const arm: NumberInput = {
  ...rodInputs.outerSpan,
  name: 'arm',
  label: 'Arm',
  symbol: 'h',
  argument: 'armMm',
  limits: 'more than 0; from the load to the fixed end',
};

export const cantileverRod: Method = {
  id: 'cantilever.rod',
  version: 1,
  line: 'load',
  title: 'Rod fixed at one end and loaded across, at the fixed end',
  inputs: [{ ...rodInputs.load, limits: '0 or more; across the rod' }, arm, rodInputs.diameter],
  outputs: [{ name: 'stress', label: 'Stress on the outer fibre at the fixed end', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: '32Fh / πD³', template: () => '32 × {load} × {arm} / (π × ({diameter})³)' },
  source: { text: 'Beam theory, M c / I with M = F h and a round section', tag: 're-derived' },
  run: (given) => ({ stress: cantileverRodStressMPa(rod(given)) }),
  sensitivities: (given) => cantileverRodSensitivities(rod(given)),
  cautions: sectionCautions,
};
