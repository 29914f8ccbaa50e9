import { averageSurfaceRadiusMm } from '../mirror/average-surface-radius.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

export const mirrorAverageRadiusSurface: Method = {
  id: 'mirror.averageRadius.surface',
  version: 1,
  line: 'supporting',
  title: 'Mirror radius of an origin at the surface',
  inputs: [
    {
      ...mirrorInputs.R,
      name: 'leftRadius',
      label: 'Radius to the left',
      symbol: 'R₁',
      argument: 'leftRadiusMm',
      limits: 'more than 0; from the origin along the tensile surface',
    },
    {
      ...mirrorInputs.R,
      name: 'rightRadius',
      label: 'Radius to the right',
      symbol: 'R₂',
      argument: 'rightRadiusMm',
      limits: 'more than 0; from the origin along the tensile surface',
    },
  ],
  outputs: [{ name: 'R', label: 'Mirror radius', symbol: 'R', unit: 'mm' }],
  mainOutput: 'R',
  formula: { symbols: '(R₁ + R₂) / 2', template: () => '({leftRadius} + {rightRadius}) / 2' },
  source: { text: 'Mean of the two radii along the original surface (as ASTM C1256 takes them)', tag: 'practice' },
  run: (given) => ({
    R: averageSurfaceRadiusMm({
      leftRadiusMm: numberGiven(given, 'leftRadius'),
      rightRadiusMm: numberGiven(given, 'rightRadius'),
    }),
  }),
  cautions: () => [],
};
