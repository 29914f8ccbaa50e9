import { gradientFactor } from '../mirror/gradient-factor.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';

// What the equations for the half-round crack are stated to hold to.
const deepest = 0.8;

function cautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'ROverDepth') <= deepest) return [];
  const sentence = `The mirror reaches more than ${deepest} of the depth: the accuracy of the factor is not stated there.`;
  return [{ code: 'beyond-stated-accuracy', weight: 'warning', sentence }];
}

export const mirrorGradientFactor: Method = {
  id: 'mirror.gradientFactor',
  version: 1,
  line: 'supporting',
  title: 'Gradient factor of a mirror in bending (estimate)',
  inputs: [
    {
      kind: 'number',
      name: 'ROverDepth',
      label: 'Mirror radius over depth',
      symbol: 'R/d',
      unit: '1',
      unitKind: 'dimensionless',
      argument: 'radiusOverDepth',
      limits: 'more than 0 and less than 1',
      openUnit: false,
      uncertainty: 'none',
    },
  ],
  outputs: [
    { name: 'surfaceFactor', label: 'Factor along the surface', symbol: 'G', unit: '1' },
    { name: 'depthFactor', label: 'Factor at the deepest point', symbol: 'Gd', unit: '1' },
  ],
  mainOutput: 'surfaceFactor',
  formula: { symbols: 'F(R/d)·H(R/d) / F(0)', template: () => 'F({ROverDepth})·H({ROverDepth}) / F(0)' },
  source: {
    text: 'Half-round surface crack after Newman and Raju, 1981, standing in for the mirror',
    tag: 're-derived',
  },
  run: (given) => {
    const { surface, depth } = gradientFactor({ radiusOverDepth: numberGiven(given, 'ROverDepth') });
    return { surfaceFactor: surface, depthFactor: depth };
  },
  cautions,
};
