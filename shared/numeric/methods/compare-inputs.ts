import type { NumberInput } from './method.ts';

const stress = { kind: 'number', unit: 'MPa', unitKind: 'stress', openUnit: true, uncertainty: 'none' } as const;

/** A stress with its standard uncertainty, as two inputs of a comparison. */
export function stressAndUncertainty(of: {
  readonly stress: Pick<NumberInput, 'name' | 'label' | 'symbol' | 'argument'>;
  readonly uncertainty: Pick<NumberInput, 'name' | 'symbol' | 'argument'>;
}): readonly [NumberInput, NumberInput] {
  return [
    { ...stress, ...of.stress, limits: 'any; tension positive' },
    {
      ...stress,
      ...of.uncertainty,
      label: `Standard uncertainty of the ${lowered(of.stress.label)}`,
      limits: 'more than 0',
    },
  ];
}

function lowered(label: string): string {
  return `${label.charAt(0).toLowerCase()}${label.slice(1)}`;
}

/** The two stresses of a pair. */
export const pairInputs: readonly NumberInput[] = [
  ...stressAndUncertainty({
    stress: { name: 'stress1', label: 'First stress', symbol: 'σ₁', argument: 'stress1MPa' },
    uncertainty: { name: 'u1', symbol: 'u₁', argument: 'u1MPa' },
  }),
  ...stressAndUncertainty({
    stress: { name: 'stress2', label: 'Second stress', symbol: 'σ₂', argument: 'stress2MPa' },
    uncertainty: { name: 'u2', symbol: 'u₂', argument: 'u2MPa' },
  }),
];
