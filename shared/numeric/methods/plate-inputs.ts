import { barInputs } from './bar-inputs.ts';
import type { NumberInput } from './method.ts';

const length = { ...barInputs.depth, limits: 'more than 0' } as const;

/** The inputs that plates and discs share. */
export const plateInputs = {
  load: { ...barInputs.load, limits: '0 or more' },
  thickness: { ...length, name: 'thickness', label: 'Thickness', symbol: 'h', argument: 'thicknessMm' },
  poisson: {
    kind: 'number',
    name: 'poisson',
    label: 'Poisson’s ratio',
    symbol: 'ν',
    unit: '1',
    unitKind: 'dimensionless',
    argument: 'poissonRatio',
    limits: '0 or more and less than 0.5',
    openUnit: false,
    uncertainty: 'expected',
  },
  supportDiameter: {
    ...length,
    name: 'supportDiameter',
    label: 'Support ring diameter',
    symbol: 'Ds',
    argument: 'supportDiameterMm',
    limits: 'more than the load ring and at most the disc',
  },
  loadDiameter: {
    ...length,
    name: 'loadDiameter',
    label: 'Load ring diameter',
    symbol: 'DL',
    argument: 'loadDiameterMm',
  },
  discDiameter: {
    ...length,
    name: 'discDiameter',
    label: 'Disc diameter',
    symbol: 'D',
    argument: 'discDiameterMm',
    limits: 'at least the support ring',
  },
  supportRadius: {
    ...length,
    name: 'supportRadius',
    label: 'Radius of the circle through the balls',
    symbol: 'r₁',
    argument: 'supportRadiusMm',
    limits: 'more than the piston and at most the disc',
  },
  pistonRadius: { ...length, name: 'pistonRadius', label: 'Piston radius', symbol: 'r₂', argument: 'pistonRadiusMm' },
  discRadius: {
    ...length,
    name: 'discRadius',
    label: 'Disc radius',
    symbol: 'r₃',
    argument: 'discRadiusMm',
    limits: 'at least the circle through the balls',
  },
  radius: { ...length, name: 'radius', label: 'Origin from the centre', symbol: 'r', argument: 'radiusMm' },
} satisfies Record<string, NumberInput>;
