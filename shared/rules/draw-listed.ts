import type { Reckoning, ReckoningWanted } from '../contracts/reckonings.ts';
import { runMethod } from '../numeric/evaluate-method.ts';
import type { GivenInputs, GivenNumber, Method } from '../numeric/methods/method.ts';
import { OutsideDomain } from '../numeric/outside-domain.ts';
import { drawMethods } from '../numeric/uncertainty/draw-methods.ts';
import type { Spread } from '../numeric/uncertainty/spread.ts';
import { givenFromListed } from './reckoning-inputs.ts';
import { plainUnit } from './reckoning-units.ts';

const controls = ['draws', 'seed', 'coverage', 'distributions'];
const usual = { draws: 200_000, seed: 1, coverage: 0.95 };

/**
 * Monte Carlo of a method on listed inputs: those with an uncertainty are drawn, the others exact. `draws`, `seed`,
 * `coverage` (0.95) and `distributions` (normal, rectangular, triangular, lognormal) may be listed too.
 * @throws OutsideDomain as the method and `drawMethods`; not-a-choice (distributions); outside-validity-range (too many
 * draws, a seed that is no whole number)
 */
export function drawListed(method: Method, { id, inputs }: ReckoningWanted, mostDraws: number): Reckoning {
  const given = givenFromListed(method, Object.fromEntries(entriesBeside(inputs)));
  const central = runMethod(method, given);
  if (central.kind === 'refused') return { id, refused: central.code, field: central.field };
  const output = method.outputs.find((each) => each.name === method.mainOutput);
  if (!output?.unit) throw new OutsideDomain('unknown-method', method.id);
  const { draws, seed, coverage } = controlsOf(inputs);
  if (draws > mostDraws) throw new OutsideDomain('outside-validity-range', 'draws');
  if (!Number.isSafeInteger(seed) || seed < 0) throw new OutsideDomain('outside-validity-range', 'seed');
  const quantities = quantitiesOf(given, inputs.distributions?.value ?? 'normal');
  const drawn = Object.fromEntries(Object.keys(quantities).map((name) => [name, [name]]));
  const run = { method, output: output.name, drawn, fixed: given };
  const [summary] = drawMethods({ quantities, methods: [run], draws, coverage, seed }).summaries;
  const inUnit = (value = Number.NaN) => ({ value, unit: plainUnit(output.unit, 0) });
  return {
    id,
    outputs: {
      mean: inUnit(summary?.mean),
      standardDeviation: inUnit(summary?.sd),
      symmetricLow: inUnit(summary?.symmetric.low),
      symmetricHigh: inUnit(summary?.symmetric.high),
      shortestLow: inUnit(summary?.shortest.low),
      shortestHigh: inUnit(summary?.shortest.high),
      coverage: { value: coverage, unit: '1' },
      draws: { value: draws, unit: '1' },
      seed: { value: seed, unit: '1' },
    },
    cautions: [...central.cautions],
  };
}

function entriesBeside(inputs: ReckoningWanted['inputs']) {
  return Object.entries(inputs).filter(([name]) => !controls.includes(name));
}

function controlsOf(inputs: ReckoningWanted['inputs']) {
  const read = (name: keyof typeof usual) => {
    const listed = inputs[name];
    if (!listed) return usual[name];
    return typeof listed.value === 'number' ? listed.value : Number.NaN;
  };
  return { draws: read('draws'), seed: read('seed'), coverage: read('coverage') };
}

function quantitiesOf(given: GivenInputs, distribution: unknown): Record<string, Spread> {
  const quantities: Record<string, Spread> = {};
  for (const [name, input] of Object.entries(given)) {
    if ('value' in input && input.standardUncertainty) quantities[name] = spreadOf(input, distribution);
  }
  return quantities;
}

function spreadOf({ value, standardUncertainty: sd = 0 }: GivenNumber, distribution: unknown): Spread {
  switch (distribution) {
    case 'normal':
    case 'lognormal':
      return { kind: distribution, mean: value, sd };
    case 'rectangular':
      return { kind: distribution, middle: value, halfWidth: sd * Math.sqrt(3) };
    case 'triangular':
      return { kind: distribution, middle: value, halfWidth: sd * Math.sqrt(6) };
    default:
      throw new OutsideDomain('not-a-choice', 'distributions');
  }
}
