import type { NumberInput } from './method.ts';

const expected = { kind: 'number', openUnit: true, uncertainty: 'expected' } as const;
const length = { ...expected, unit: 'mm', unitKind: 'length' } as const;
const modulus = { ...expected, unit: 'GPa', unitKind: 'modulus', limits: 'more than 0' } as const;
const poisson = {
  ...expected,
  openUnit: false,
  unit: '1',
  unitKind: 'dimensionless',
  limits: '0 or more and less than 0.5',
} as const;

/** The inputs of the methods about contact, each described once. */
export const contactInputs = {
  load: {
    ...expected,
    name: 'load',
    label: 'Contact load',
    symbol: 'P',
    unit: 'N',
    unitKind: 'force',
    argument: 'loadN',
    limits: '0 or more',
  },
  radius: {
    ...length,
    name: 'radius',
    label: 'Radius of the sphere',
    symbol: 'R',
    argument: 'radiusMm',
    limits: 'more than 0; of two spheres 1/R = 1/R₁ + 1/R₂',
  },
  sphereModulus: {
    ...modulus,
    name: 'E1',
    label: 'Modulus of the sphere',
    symbol: 'E₁',
    argument: 'sphereModulusGPa',
  },
  spherePoisson: {
    ...poisson,
    name: 'nu1',
    label: 'Poisson’s ratio of the sphere',
    symbol: 'ν₁',
    argument: 'spherePoissonRatio',
  },
  partModulus: { ...modulus, name: 'E2', label: 'Modulus of the part', symbol: 'E₂', argument: 'partModulusGPa' },
  partPoisson: {
    ...poisson,
    name: 'nu2',
    label: 'Poisson’s ratio of the part',
    symbol: 'ν₂',
    argument: 'partPoissonRatio',
  },
  edgeStress: {
    kind: 'number',
    name: 'edgeTensileStress',
    label: 'Tension at the edge of the contact',
    symbol: 'σ',
    unit: 'MPa',
    unitKind: 'stress',
    argument: 'edgeTensileStressMPa',
    limits: 'more than 0',
    openUnit: true,
    uncertainty: 'none',
  },
  contactRadius: {
    ...length,
    name: 'contactRadius',
    label: 'Radius of the contact',
    symbol: 'a',
    argument: 'contactRadiusMm',
    limits: 'more than 0',
    uncertainty: 'none',
  },
  distance: {
    ...length,
    name: 'r',
    label: 'Distance from the middle of the contact',
    symbol: 'r',
    argument: 'distanceMm',
    limits: 'at least the radius of the contact',
    uncertainty: 'none',
  },
} satisfies Record<string, NumberInput>;
