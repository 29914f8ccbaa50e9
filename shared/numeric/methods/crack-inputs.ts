import type { CodeInput, NumberInput } from './method.ts';

const length = { kind: 'number', unit: 'mm', unitKind: 'length', openUnit: true, uncertainty: 'none' } as const;
const ratio = { kind: 'number', unit: '1', unitKind: 'dimensionless', openUnit: false, uncertainty: 'none' } as const;

/** The inputs that the shape factors of cracks share, each described once. */
export const crackInputs = {
  depth: {
    ...length,
    name: 'a',
    label: 'Depth of the crack',
    symbol: 'a',
    argument: 'flawDepthMm',
    limits: 'more than 0 and less than the thickness',
  },
  halfLength: {
    ...length,
    name: 'c',
    label: 'Half-length of the crack',
    symbol: 'c',
    argument: 'flawHalfLengthMm',
    limits: 'more than 0; half of its length on the surface, never the full length',
  },
  cornerLength: {
    ...length,
    name: 'c',
    label: 'Length of the crack along the width',
    symbol: 'c',
    argument: 'flawLengthMm',
    limits: 'more than 0; from the corner',
  },
  halfDepth: {
    ...length,
    name: 'a',
    label: 'Half-depth of the crack',
    symbol: 'a',
    argument: 'flawHalfDepthMm',
    limits: 'more than 0; half of the crack along the thickness',
  },
  minorHalfAxis: {
    ...length,
    name: 'a',
    label: 'Minor half-axis',
    symbol: 'a',
    argument: 'minorHalfAxisMm',
    limits: 'more than 0; half of the width, never the full width',
  },
  majorHalfAxis: {
    ...length,
    name: 'c',
    label: 'Major half-axis',
    symbol: 'c',
    argument: 'majorHalfAxisMm',
    limits: 'at least the minor half-axis; half of the length',
  },
  thickness: {
    ...length,
    name: 't',
    label: 'Thickness of the section',
    symbol: 't',
    argument: 'thicknessMm',
    limits: 'more than 0; the section along the depth of the crack',
  },
  halfWidth: {
    ...length,
    name: 'halfWidth',
    label: 'Half of the width of the section',
    symbol: 'b',
    argument: 'halfWidthMm',
    limits: 'more than 0; left out for a wide section',
    optional: true,
  },
  width: {
    ...length,
    name: 'width',
    label: 'Width of the section',
    symbol: 'b',
    argument: 'widthMm',
    limits: 'more than 0; the full width, left out for a wide section',
    optional: true,
  },
  angle: {
    kind: 'number',
    name: 'phi',
    label: 'Place on the front',
    symbol: 'φ',
    unit: '°',
    unitKind: 'angle',
    argument: 'angleDegrees',
    limits: '0 to 90; 0 at the surface along the length, 90 at the deepest point; left out for the whole front',
    openUnit: false,
    uncertainty: 'none',
    optional: true,
  },
  minorOverMajor: {
    ...ratio,
    name: 'aOverC',
    label: 'Minor over major half-axis',
    symbol: 'a/c',
    argument: 'minorOverMajor',
    limits: 'more than 0, at most 1',
  },
  depthOverSection: {
    ...ratio,
    name: 'aOverW',
    label: 'Depth of the crack over depth of the section',
    symbol: 'a/W',
    argument: 'depthOverSection',
    limits: '0 to 0.6',
  },
} satisfies Record<string, NumberInput>;

export const loadModes = ['tension', 'bending'] as const;

export const loadModeInput: CodeInput = {
  kind: 'code',
  name: 'mode',
  label: 'Loading',
  choices: [
    { code: 'tension', label: 'Tension' },
    { code: 'bending', label: 'Bending, with the outer-fibre stress' },
  ],
};
