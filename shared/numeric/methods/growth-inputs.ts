import type { NumberInput } from './method.ts';

const number = { kind: 'number', uncertainty: 'none' } as const;
const stress = { ...number, unit: 'MPa', unitKind: 'stress', openUnit: true } as const;
const rate = { ...number, unit: 'MPa/s', unitKind: 'stressRate', openUnit: true } as const;

/** The inputs that the methods of slow crack growth share, each described once. */
export const growthInputs = {
  stress: {
    ...stress,
    name: 'stress',
    label: 'Fracture stress',
    symbol: 'σ',
    argument: 'stressMPa',
    limits: 'more than 0',
  },
  inertStrength: {
    ...stress,
    name: 'inertStrength',
    label: 'Inert strength',
    symbol: 'Si',
    argument: 'inertStrengthMPa',
    limits: 'more than 0; without slow crack growth',
  },
  rate: {
    ...rate,
    name: 'rate',
    label: 'Stress rate',
    symbol: 'σ̇',
    argument: 'rateMPaPerS',
    limits: 'more than 0',
  },
  targetRate: {
    ...rate,
    name: 'targetRate',
    label: 'Stress rate wanted',
    symbol: 'σ̇₂',
    argument: 'targetRateMPaPerS',
    limits: 'more than 0',
  },
  growthConstant: {
    ...number,
    name: 'B',
    label: 'Constant B of slow crack growth',
    symbol: 'B',
    unit: 'MPa²·s',
    unitKind: 'growthConstant',
    argument: 'growthConstantMPa2S',
    limits: 'more than 0; 2KIc² / [AY²(n − 2)]',
    openUnit: true,
  },
  exponent: {
    ...number,
    name: 'n',
    label: 'Exponent of slow crack growth',
    symbol: 'n',
    unit: '1',
    unitKind: 'dimensionless',
    argument: 'exponent',
    limits: 'more than 2',
    openUnit: false,
  },
} satisfies Record<string, NumberInput>;
