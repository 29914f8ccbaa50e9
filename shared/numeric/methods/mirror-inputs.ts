import type { ListInput, NumberInput } from './method.ts';

const exact = { kind: 'number', uncertainty: 'none' } as const;
const toughness = { ...exact, unit: 'MPa√m', unitKind: 'toughness', openUnit: true } as const;
const length = { ...exact, unit: 'mm', unitKind: 'length', openUnit: true } as const;
const stress = { ...exact, unit: 'MPa', unitKind: 'stress', openUnit: true } as const;
const list = { kind: 'list', openUnit: true, uncertainty: 'none' } as const;

/** The inputs that the methods about mirrors share, each described once. */
export const mirrorInputs = {
  A: {
    ...toughness,
    name: 'A',
    label: 'Mirror constant',
    symbol: 'A',
    argument: 'mirrorConstantMPaRootM',
    limits: 'more than 0; of the same boundary as the radius',
  },
  R: {
    ...length,
    name: 'R',
    label: 'Mirror radius',
    symbol: 'R',
    argument: 'radiusMm',
    limits: 'more than 0; from the origin, along the tensile face in a bent bar',
  },
  stress: {
    ...stress,
    name: 'stress',
    label: 'Stress at the origin',
    symbol: 'σ',
    argument: 'stressMPa',
    limits: 'more than 0; total, applied and residual together',
  },
  KIc: {
    ...toughness,
    name: 'KIc',
    label: 'Fracture toughness',
    symbol: 'KIc',
    argument: 'toughnessMPaRootM',
    limits: 'more than 0',
  },
  Y: {
    ...exact,
    name: 'Y',
    label: 'Shape factor',
    symbol: 'Y',
    unit: '1',
    unitKind: 'dimensionless',
    openUnit: false,
    argument: 'shapeFactor',
    limits: 'more than 0; with √π inside',
  },
} satisfies Record<string, NumberInput>;

/** The two lists of a lot of mirrors, in one order. */
export function lotInputs(fewest: number): readonly ListInput[] {
  return [
    {
      ...list,
      name: 'R',
      label: 'Mirror radii',
      symbol: 'R',
      unit: 'mm',
      unitKind: 'length',
      argument: 'radiiMm',
      limits: 'each more than 0; of one boundary',
      fewest,
    },
    {
      ...list,
      name: 'stress',
      label: 'Stresses',
      symbol: 'σ',
      unit: 'MPa',
      unitKind: 'stress',
      argument: 'stressesMPa',
      limits: 'each more than 0; as many as radii, in their order',
      fewest,
    },
  ];
}
