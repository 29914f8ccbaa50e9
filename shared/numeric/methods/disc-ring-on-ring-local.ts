import { ringOnRingLocalStress } from '../bending/ring-on-ring-local-stress.ts';
import { loadRingCautions, ringOnRingCautions } from './disc-cautions.ts';
import { discStressOutputs, discStressToOutputs } from './disc-outputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { plateInputs } from './plate-inputs.ts';
import { ringOnRingGiven, ringOnRingInputs } from './ring-on-ring-inputs.ts';
import { withoutUncertainty } from './without-uncertainty.ts';

const radius = { ...plateInputs.radius, limits: '0 to the support ring; on the tensile face' };

export const discRingOnRingLocal: Method = {
  id: 'disc.ringOnRing.local',
  version: 1,
  line: 'supporting',
  title: 'Disc between two rings, at a distance from the centre on the tensile face',
  inputs: [...ringOnRingInputs, radius].map(withoutUncertainty),
  outputs: discStressOutputs,
  mainOutput: 'tangentialStress',
  formula: {
    symbols: 'σ − 3F / 2πh² · [(1 + ν) ln q ∓ ½(1 − ν)(1 − q⁻²)], q = 2r/DL outside the load ring, 1 within',
    template: () => 'q = 2 × {radius} / {loadDiameter}, at least 1',
  },
  source: { text: 'Thin-plate solution between the rings', tag: 're-derived' },
  run: (given) =>
    discStressToOutputs(ringOnRingLocalStress({ ...ringOnRingGiven(given), radiusMm: numberGiven(given, 'radius') })),
  cautions: (given) => [...ringOnRingCautions(given), ...loadRingCautions(given)],
};
