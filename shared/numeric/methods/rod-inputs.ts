import { barInputs } from './bar-inputs.ts';
import type { GivenInputs, NumberInput } from './method.ts';

/** The inputs of the rod methods; load, spans and x are those of a bar. */
export const rodInputs = {
  ...barInputs,
  diameter: {
    ...barInputs.depth,
    name: 'diameter',
    label: 'Diameter',
    symbol: 'D',
    argument: 'diameterMm',
    limits: 'more than 0; of the round section',
  },
  y: {
    ...barInputs.y,
    label: 'Origin above the lowest fibre',
    limits: '0 to the diameter; along the load, from the fibre that was most in tension',
  },
  angle: {
    kind: 'number',
    name: 'angle',
    label: 'Origin round from the lowest fibre',
    symbol: 'θ',
    unit: '°',
    unitKind: 'angle',
    argument: 'angleDeg',
    limits: '−180° to 180°; round the surface, from the fibre that was most in tension',
    openUnit: false,
    uncertainty: 'expected',
  },
} satisfies Record<string, NumberInput>;

/** A rod as the remarks on bars take it: the diameter is its depth. */
export function asBar(given: GivenInputs): GivenInputs {
  const { diameter } = given;
  return diameter ? { ...given, depth: diameter } : given;
}
