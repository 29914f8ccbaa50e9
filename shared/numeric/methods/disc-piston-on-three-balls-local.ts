import { pistonOnThreeBallsLocalStress } from '../bending/piston-on-three-balls-local-stress.ts';
import { sectionCautions } from './bar-cautions.ts';
import { offCentreCautions } from './disc-cautions.ts';
import { discStressOutputs, discStressToOutputs } from './disc-outputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { pistonGiven, pistonInputs } from './piston-inputs.ts';
import { plateInputs } from './plate-inputs.ts';
import { withoutUncertainty } from './without-uncertainty.ts';

const radius = { ...plateInputs.radius, limits: '0 to the piston; on the tensile face' };

export const discPistonOnThreeBallsLocal: Method = {
  id: 'disc.pistonOnThreeBalls.local',
  version: 1,
  line: 'supporting',
  title: 'Disc on three balls under a piston, opposite the piston',
  inputs: [...pistonInputs, radius].map(withoutUncertainty),
  outputs: discStressOutputs,
  mainOutput: 'tangentialStress',
  formula: {
    symbols: 'σᵣ = σ − 3F(3 + ν)r² / 8πr₂²h², σθ = σ − 3F(1 + 3ν)r² / 8πr₂²h²',
    template: () => 'σ − 3 × {load} × (1 + 3 × {poisson}) × ({radius})² / (8π × ({pistonRadius})² × ({thickness})²)',
  },
  source: { text: 'Thin plate under even pressure within a ring', tag: 're-derived' },
  run: (given) =>
    discStressToOutputs(
      pistonOnThreeBallsLocalStress({ ...pistonGiven(given), radiusMm: numberGiven(given, 'radius') }),
    ),
  cautions: (given) => [...sectionCautions(given), ...offCentreCautions(given)],
};
