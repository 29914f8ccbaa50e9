import { supportedPlateStressMPa } from '../bending/supported-plate-stress.ts';
import { supportedPlateSensitivities } from '../uncertainty/supported-plate-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method, NumberInput } from './method.ts';
import { plateInputs } from './plate-inputs.ts';

const plate = (given: GivenInputs) => ({
  pressureMPa: numberGiven(given, 'pressure'),
  radiusMm: numberGiven(given, 'radius'),
  thicknessMm: numberGiven(given, 'thickness'),
  poissonRatio: numberGiven(given, 'poisson'),
});

const pressure: NumberInput = {
  kind: 'number',
  name: 'pressure',
  label: 'Pressure',
  symbol: 'p',
  unit: 'MPa',
  unitKind: 'stress',
  argument: 'pressureMPa',
  limits: '0 or more; on the whole face within the support',
  openUnit: true,
  uncertainty: 'expected',
};
const radius: NumberInput = { ...plateInputs.radius, label: 'Support radius', limits: 'more than 0; of the support' };
const thickness: NumberInput = { ...plateInputs.thickness, symbol: 't' };

function cautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'pressure') !== 0) return [];
  return [{ code: 'zero-load', weight: 'warning', sentence: 'The pressure is zero, so the stress is zero.' }];
}

export const plateSupportedPressure: Method = {
  id: 'plate.supported.pressure',
  version: 1,
  line: 'load',
  title: 'Round plate under pressure, its edge supported, at the centre',
  inputs: [pressure, radius, thickness, plateInputs.poisson],
  outputs: [{ name: 'stress', label: 'Stress at the centre of the tensile face', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: {
    symbols: '3(3 + ν)p(r/t)² / 8',
    template: () => '3 × (3 + {poisson}) × {pressure} × ({radius} / {thickness})² / 8',
  },
  source: { text: 'Thin-plate theory, edge supported and free to turn', tag: 're-derived' },
  run: (given) => ({ stress: supportedPlateStressMPa(plate(given)) }),
  sensitivities: (given) => supportedPlateSensitivities(plate(given)),
  cautions,
};
