import { flawStressMPa } from '../fracture/flaw-stress.ts';
import { flawSensitivities } from '../uncertainty/flaw-sensitivities.ts';
import { numberGiven, optionalNumberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';

// Flaw size in grains below which the long-crack toughness does not hold: trade practice.
const leastFlawInGrains = 5;

const flaw = (given: GivenInputs) => ({
  toughnessMPaRootM: numberGiven(given, 'KIc'),
  shapeFactor: numberGiven(given, 'Y'),
  flawSizeMm: numberGiven(given, 'c'),
});

function cautions(given: GivenInputs): Caution[] {
  const grain = optionalNumberGiven(given, 'grainSize');
  if (grain === undefined || numberGiven(given, 'c') >= leastFlawInGrains * grain) return [];
  const sentence = `The flaw is smaller than ${leastFlawInGrains} grains: the toughness that held at the origin may be lower than the one entered.`;
  return [{ code: 'flaw-small-against-grain', weight: 'warning', sentence }];
}

export const flawStress: Method = {
  id: 'flaw.stress',
  version: 1,
  line: 'flaw',
  title: 'Stress from the flaw size',
  inputs: [
    {
      kind: 'number',
      name: 'KIc',
      label: 'Fracture toughness',
      symbol: 'KIc',
      unit: 'MPa√m',
      unitKind: 'toughness',
      argument: 'toughnessMPaRootM',
      limits: 'more than 0',
      openUnit: true,
      uncertainty: 'expected',
    },
    {
      kind: 'number',
      name: 'Y',
      label: 'Shape factor',
      symbol: 'Y',
      unit: '1',
      unitKind: 'dimensionless',
      argument: 'shapeFactor',
      limits: 'more than 0; with √π inside',
      openUnit: false,
      uncertainty: 'expected',
    },
    {
      kind: 'number',
      name: 'c',
      label: 'Flaw size',
      symbol: 'c',
      unit: 'mm',
      unitKind: 'length',
      argument: 'flawSizeMm',
      limits: 'more than 0; depth, half of the smaller width, or radius, never the full width',
      openUnit: true,
      uncertainty: 'expected',
    },
    {
      kind: 'number',
      name: 'grainSize',
      label: 'Grain size',
      symbol: 'g',
      unit: 'mm',
      unitKind: 'length',
      argument: 'grainSizeMm',
      limits: 'more than 0; to tell whether the flaw is large enough against the grains',
      openUnit: true,
      uncertainty: 'none',
      optional: true,
    },
  ],
  outputs: [{ name: 'stress', label: 'Total stress at the flaw', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: 'KIc / (Y√c)', template: () => '{KIc} / ({Y} × √({c@m}))' },
  source: { text: 'Stress intensity K = Yσ√c at K = KIc', tag: 're-derived' },
  run: (given) => ({ stress: flawStressMPa(flaw(given)) }),
  sensitivities: (given) => flawSensitivities(flaw(given)),
  cautions,
};
