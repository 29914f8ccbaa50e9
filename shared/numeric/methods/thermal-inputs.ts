import type { Caution, NumberInput } from './method.ts';

const expected = { kind: 'number', openUnit: true, uncertainty: 'expected' } as const;
const ratio = { kind: 'number', unit: '1', unitKind: 'dimensionless', openUnit: false } as const;

/** The inputs that the thermal methods share, each described once. */
export const thermalInputs = {
  modulus: {
    ...expected,
    name: 'E',
    label: 'Modulus',
    symbol: 'E',
    unit: 'GPa',
    unitKind: 'modulus',
    argument: 'modulusGPa',
    limits: 'more than 0',
  },
  expansion: {
    ...expected,
    name: 'alpha',
    label: 'Thermal expansion',
    symbol: 'α',
    unit: 'K⁻¹',
    unitKind: 'expansion',
    argument: 'expansionPerK',
    limits: 'any; 8.5 × 10⁻⁶/K for soda-lime glass',
  },
  drop: {
    ...expected,
    name: 'deltaT',
    label: 'Face colder than the body by',
    symbol: 'ΔT',
    unit: 'K',
    unitKind: 'temperatureDifference',
    argument: 'temperatureDropK',
    limits: 'any; below 0 where the face is hotter',
  },
  poisson: {
    ...ratio,
    name: 'poisson',
    label: 'Poisson’s ratio',
    symbol: 'ν',
    argument: 'poissonRatio',
    limits: '0 or more and less than 0.5',
    uncertainty: 'expected',
  },
  heatTransfer: {
    ...expected,
    name: 'h',
    label: 'Heat transfer at the face',
    symbol: 'h',
    unit: 'W/(m²·K)',
    unitKind: 'heatTransfer',
    argument: 'heatTransferWPerM2K',
    limits: 'more than 0; rarely known better than to a factor of 2',
  },
  halfThickness: {
    ...expected,
    name: 'halfThickness',
    label: 'Half of the thickness',
    symbol: 's',
    unit: 'mm',
    unitKind: 'length',
    argument: 'halfThicknessMm',
    limits: 'more than 0',
  },
  conductivity: {
    ...expected,
    name: 'conductivity',
    label: 'Heat conductivity',
    symbol: 'k',
    unit: 'W/(m·K)',
    unitKind: 'conductivity',
    argument: 'conductivityWPerMK',
    limits: 'more than 0',
  },
  biot: {
    ...ratio,
    name: 'biot',
    label: 'Biot number',
    symbol: 'Bi',
    argument: 'biotNumber',
    limits: 'more than 0; heat transfer × half thickness / conductivity',
    uncertainty: 'none',
  },
} satisfies Record<string, NumberInput>;

/** A face that is hotter than the body. */
export function heatingCautions(temperatureDropK: number): Caution[] {
  if (temperatureDropK >= 0) return [];
  const sentence = 'The face is heated: it is pressed, and the middle is pulled, at most about half as much.';
  return [{ code: 'face-heated', weight: 'note', sentence }];
}

// Where the fit was compared with the series of the infinite plate.
const comparedBiot = { least: 0.1, largest: 50 };

export function biotCautions(biotNumber: unknown): Caution[] {
  if (typeof biotNumber !== 'number') return [];
  if (biotNumber >= comparedBiot.least && biotNumber <= comparedBiot.largest) return [];
  const sentence = `The Biot number is outside ${comparedBiot.least} to ${comparedBiot.largest}: the fit was not compared with the exact series there.`;
  return [{ code: 'biot-not-compared', weight: 'warning', sentence }];
}
