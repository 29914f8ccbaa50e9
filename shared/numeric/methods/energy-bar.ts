import { storedEnergy } from '../bending/stored-energy.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method, NumberInput } from './method.ts';

const bar = (given: GivenInputs) => ({
  stressMPa: numberGiven(given, 'stress'),
  modulusGPa: numberGiven(given, 'E'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  toughnessMPaRootM: numberGiven(given, 'KIc'),
  poissonRatio: numberGiven(given, 'poisson'),
});

const stress: NumberInput = {
  ...checkInputs.modulus,
  name: 'stress',
  label: 'Stress on the outer fibre at fracture',
  symbol: 'σ',
  unit: 'MPa',
  unitKind: 'stress',
  argument: 'stressMPa',
};
const toughness: NumberInput = {
  ...checkInputs.modulus,
  name: 'KIc',
  label: 'Fracture toughness',
  symbol: 'KIc',
  unit: 'MPa√m',
  unitKind: 'toughness',
  argument: 'toughnessMPaRootM',
};

// Trade practice: a few per cent of the energy goes into new surface.
const upperBound: Caution = {
  code: 'upper-bound',
  weight: 'note',
  sentence:
    'The number of cracks is an upper bound: most of the energy leaves as motion and sound, and the count in practice is a few per cent of it.',
};

export const energyBar: Method = {
  id: 'energy.bar',
  version: 1,
  line: 'supporting',
  title: 'Energy stored in a bar at fracture',
  inputs: [
    stress,
    { ...checkInputs.modulus, name: 'E' },
    checkInputs.width,
    checkInputs.depth,
    checkInputs.outerSpan,
    { ...checkInputs.innerSpan, limits: '0 or more and less than the outer span; 0 for three points' },
    toughness,
    checkInputs.poisson,
  ],
  outputs: [
    { name: 'energy', label: 'Stored energy', symbol: 'U', unit: 'mJ' },
    { name: 'GIc', label: 'Energy to drive a crack', symbol: 'GIc', unit: 'J/m²' },
    { name: 'crackCountBound', label: 'Cracks through the section, at most', symbol: 'N', unit: '1' },
  ],
  mainOutput: 'energy',
  formula: {
    symbols: '(σ²bd / 6E)[l + (L − l)/3]',
    template: () =>
      '({stress})² × {width} × {depth} / (6 × {E}) × [{innerSpan#} + ({outerSpan#} − {innerSpan#}) / 3] mm',
  },
  source: { text: 'Beam theory, M²/(2EI) integrated; GIc = KIc²(1 − ν²)/E', tag: 're-derived' },
  run: (given) => {
    const { energyMJ, energyReleaseJPerM2, crackCount } = storedEnergy(bar(given));
    return { energy: energyMJ, GIc: energyReleaseJPerM2, crackCountBound: crackCount };
  },
  cautions: () => [upperBound],
};
