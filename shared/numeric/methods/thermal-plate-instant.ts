import { plateInstantStressMPa } from '../thermal/plate-instant-stress.ts';
import { plateInstantSensitivities } from '../uncertainty/thermal-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { heatingCautions, thermalInputs } from './thermal-inputs.ts';

const plate = (given: GivenInputs) => ({
  modulusGPa: numberGiven(given, 'E'),
  expansionPerK: numberGiven(given, 'alpha'),
  temperatureDropK: numberGiven(given, 'deltaT'),
  poissonRatio: numberGiven(given, 'poisson'),
});

export const thermalPlateInstant: Method = {
  id: 'thermal.plateInstant',
  version: 1,
  line: 'supporting',
  title: 'Stress of a face cooled at once, an upper bound',
  inputs: [thermalInputs.modulus, thermalInputs.expansion, thermalInputs.drop, thermalInputs.poisson],
  outputs: [{ name: 'stress', label: 'Stress in the face', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: 'EαΔT / (1 − ν)', template: () => '{E} × {alpha} × {deltaT} / (1 − {poisson})' },
  source: { text: 'Face fully held in both directions', tag: 're-derived' },
  run: (given) => ({ stress: plateInstantStressMPa(plate(given)) }),
  sensitivities: (given) => plateInstantSensitivities(plate(given)),
  cautions: (given) => heatingCautions(numberGiven(given, 'deltaT')),
};
