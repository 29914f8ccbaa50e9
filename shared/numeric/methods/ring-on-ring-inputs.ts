import type { RingOnRingDisc } from '../bending/ring-on-ring-stress.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, NumberInput } from './method.ts';
import { plateInputs } from './plate-inputs.ts';

export const ringOnRingInputs: readonly NumberInput[] = [
  plateInputs.load,
  plateInputs.thickness,
  plateInputs.poisson,
  plateInputs.supportDiameter,
  plateInputs.loadDiameter,
  plateInputs.discDiameter,
];

/** The disc that was given. */
export function ringOnRingGiven(given: GivenInputs): RingOnRingDisc {
  return {
    loadN: numberGiven(given, 'load'),
    thicknessMm: numberGiven(given, 'thickness'),
    poissonRatio: numberGiven(given, 'poisson'),
    supportDiameterMm: numberGiven(given, 'supportDiameter'),
    loadDiameterMm: numberGiven(given, 'loadDiameter'),
    discDiameterMm: numberGiven(given, 'discDiameter'),
  };
}
