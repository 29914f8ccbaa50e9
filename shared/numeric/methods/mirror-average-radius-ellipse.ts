import { averageEllipseRadius } from '../mirror/average-ellipse-radius.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

export const mirrorAverageRadiusEllipse: Method = {
  id: 'mirror.averageRadius.ellipse',
  version: 1,
  line: 'supporting',
  title: 'Mirror radius of an origin inside the section',
  inputs: [
    {
      ...mirrorInputs.R,
      name: 'R1',
      label: 'Radius in one direction',
      symbol: 'R₁',
      argument: 'radius1Mm',
      limits: 'more than 0; from the origin',
    },
    {
      ...mirrorInputs.R,
      name: 'R2',
      label: 'Radius at right angles to it',
      symbol: 'R₂',
      argument: 'radius2Mm',
      limits: 'more than 0; from the origin',
    },
  ],
  outputs: [
    { name: 'geometricMean', label: 'Radius of a clear ellipse', symbol: '√(R₁R₂)', unit: 'mm' },
    { name: 'arithmeticMean', label: 'Radius of a near-circle', symbol: '(R₁ + R₂)/2', unit: 'mm' },
  ],
  mainOutput: 'geometricMean',
  formula: { symbols: '√(R₁R₂)', template: () => '√({R1} × {R2})' },
  source: { text: 'Means of two half-axes at right angles', tag: 'practice' },
  run: (given) => {
    const { geometricMeanMm, arithmeticMeanMm } = averageEllipseRadius({
      radius1Mm: numberGiven(given, 'R1'),
      radius2Mm: numberGiven(given, 'R2'),
    });
    return { geometricMean: geometricMeanMm, arithmeticMean: arithmeticMeanMm };
  },
  cautions: () => [],
};
