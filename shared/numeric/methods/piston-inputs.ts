import type { PistonOnThreeBallsDisc } from '../bending/piston-on-three-balls-stress.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, NumberInput } from './method.ts';
import { plateInputs } from './plate-inputs.ts';

export const pistonInputs: readonly NumberInput[] = [
  plateInputs.load,
  plateInputs.thickness,
  plateInputs.poisson,
  plateInputs.supportRadius,
  plateInputs.pistonRadius,
  plateInputs.discRadius,
];

/** The disc that was given. */
export function pistonGiven(given: GivenInputs): PistonOnThreeBallsDisc {
  return {
    loadN: numberGiven(given, 'load'),
    thicknessMm: numberGiven(given, 'thickness'),
    poissonRatio: numberGiven(given, 'poisson'),
    supportRadiusMm: numberGiven(given, 'supportRadius'),
    pistonRadiusMm: numberGiven(given, 'pistonRadius'),
    discRadiusMm: numberGiven(given, 'discRadius'),
  };
}
