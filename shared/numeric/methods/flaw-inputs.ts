import type { NumberInput } from './method.ts';

const exact = { kind: 'number', uncertainty: 'none' } as const;
const length = { ...exact, unit: 'mm', unitKind: 'length', openUnit: true } as const;
const stress = { ...exact, unit: 'MPa', unitKind: 'stress', openUnit: true } as const;
const ratio = { ...exact, unit: '1', unitKind: 'dimensionless', openUnit: false } as const;

/** The inputs that the methods about flaws share beside those of a crack, each described once. */
export const flawInputs = {
  KIc: {
    ...exact,
    name: 'KIc',
    label: 'Fracture toughness',
    symbol: 'KIc',
    unit: 'MPa√m',
    unitKind: 'toughness',
    argument: 'toughnessMPaRootM',
    limits: 'more than 0',
    openUnit: true,
  },
  shapeFactor: {
    ...ratio,
    name: 'Y',
    label: 'Shape factor',
    symbol: 'Y',
    argument: 'shapeFactor',
    limits: 'more than 0; with √π inside',
  },
  stress: {
    ...stress,
    name: 'stress',
    label: 'Stress at the origin',
    symbol: 'σ',
    argument: 'stressMPa',
    limits: 'more than 0; total',
  },
  shape: {
    ...ratio,
    name: 'aOverC',
    label: 'Depth over half-length of the flaw',
    symbol: 'a/c',
    argument: 'depthOverHalfLength',
    limits: 'more than 0, at most 2',
  },
  radius: {
    ...length,
    name: 'a',
    label: 'Radius of the flaw',
    symbol: 'a',
    argument: 'radiusMm',
    limits: 'more than 0; half of the width, never the full width',
  },
  stressAtCentre: {
    ...stress,
    name: 'stressAtCentre',
    label: 'Stress at the centre of the flaw',
    symbol: 'σc',
    argument: 'stressAtCentreMPa',
    limits: 'more than 0',
  },
  gradient: {
    ...exact,
    name: 'gradient',
    label: 'Rise of stress towards the tensile face',
    symbol: 'g',
    unit: 'MPa/mm',
    unitKind: 'stressGradient',
    argument: 'gradientMPaPerMm',
    limits: 'any; in bending twice the outer-fibre stress over the depth',
    openUnit: true,
  },
  poreRadius: {
    ...length,
    name: 'poreRadius',
    label: 'Radius of the pore',
    symbol: 'R',
    argument: 'poreRadiusMm',
    limits: 'more than 0; half of the width, never the full width',
  },
  crackLength: {
    ...length,
    name: 'crackLength',
    label: 'Length of the crack round the pore',
    symbol: 'ℓ',
    argument: 'crackLengthMm',
    limits: 'more than 0; often one grain',
  },
  poisson: {
    ...ratio,
    name: 'poisson',
    label: 'Poisson’s ratio',
    symbol: 'ν',
    argument: 'poissonRatio',
    limits: '0 or more and less than 0.5',
  },
} satisfies Record<string, NumberInput>;
