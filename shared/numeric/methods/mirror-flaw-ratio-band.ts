import { constantOverToughness } from '../mirror/constant-over-toughness.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';
import { mirrorInputs } from './mirror-inputs.ts';

// A half-round flaw at the surface.
const semicircleShapeFactor = 1.29;

const read = (given: GivenInputs, name: string) =>
  constantOverToughness({ radiusOverFlaw: numberGiven(given, name), shapeFactor: numberGiven(given, 'Y') });

function cautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'ratioInner') < numberGiven(given, 'ratioOuter')) return [];
  const sentence = 'The inner edge lies nearer to the origin than the outer one; these two ratios say otherwise.';
  return [{ code: 'edges-out-of-order', weight: 'warning', sentence }];
}

export const mirrorFlawRatioBand: Method = {
  id: 'mirror.flawRatio.band',
  version: 1,
  line: 'supporting',
  title: 'Mirror constants over toughness from the usual ratios',
  inputs: [
    {
      ...mirrorInputs.Y,
      name: 'ratioInner',
      label: 'Inner mirror radius over flaw size',
      symbol: 'Ri/c',
      argument: 'ratioInner',
      limits: 'more than 0',
    },
    {
      ...mirrorInputs.Y,
      name: 'ratioOuter',
      label: 'Outer mirror radius over flaw size',
      symbol: 'Ro/c',
      argument: 'ratioOuter',
      limits: 'more than 0',
    },
    { ...mirrorInputs.Y, default: semicircleShapeFactor },
  ],
  outputs: [
    { name: 'AinnerOverKIc', label: 'Inner mirror constant over toughness', symbol: 'Ai/KIc', unit: '1' },
    { name: 'AouterOverKIc', label: 'Outer mirror constant over toughness', symbol: 'Ao/KIc', unit: '1' },
  ],
  formula: { symbols: '√(R/c) / Y', template: () => '√{ratioInner} / {Y} and √{ratioOuter} / {Y}' },
  source: {
    text: 'R/c = (AY/KIc)² turned round; 10 and 13 in most glasses after Mecholsky, Rice and Freiman, 1974',
    tag: 'looked up',
  },
  run: (given) => ({ AinnerOverKIc: read(given, 'ratioInner'), AouterOverKIc: read(given, 'ratioOuter') }),
  cautions,
};
