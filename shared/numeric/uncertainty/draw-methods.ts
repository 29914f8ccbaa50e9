import type { GivenInputs, Method } from '../methods/method.ts';
import { OutsideDomain } from '../outside-domain.ts';
import { requireThat } from '../require.ts';
import { propagateDraws, type Drawn, type Model } from './propagate-draws.ts';
import type { Spread } from './spread.ts';

export type MethodDrawn = {
  readonly method: Method;
  /** Name of a number among the method's outputs. */
  readonly output: string;
  /**
   * By input: the quantities whose product it is, by name. One name for an input that is drawn as it stands; two for a
   * length in pixels times a pixel size that other lengths share.
   */
  readonly drawn: Readonly<Record<string, readonly string[]>>;
  /** The inputs that are not drawn: codes, lists, exact numbers. */
  readonly fixed?: GivenInputs;
};

export type MethodsDrawing = {
  /** By name; each is drawn once for all methods. */
  readonly quantities: Readonly<Record<string, Spread>>;
  readonly methods: readonly MethodDrawn[];
  readonly draws: number;
  readonly coverage: number;
  readonly seed: number | bigint;
};

// A spread that often reaches where the formula does not hold is the wrong spread; a stray draw is no matter.
const mostLeftOut = 1e-3;

/**
 * Monte Carlo uncertainty of methods of the table on common inputs. Same seed, same digits.
 * Source: JCGM 101:2008.
 * @throws OutsideDomain as `propagateDraws`; unknown-input (a quantity that is not there); outside-validity-range, when a
 * formula refuses more than one draw in a thousand: such a size is lognormal rather than normal
 */
export function drawMethods(drawing: MethodsDrawing): Drawn {
  const names = Object.keys(drawing.quantities);
  const drawn = propagateDraws({
    spreads: Object.values(drawing.quantities),
    models: drawing.methods.map((each) => modelOf(each, names)),
    draws: drawing.draws,
    coverage: drawing.coverage,
    seed: drawing.seed,
  });
  requireThat(drawn.leftOut <= mostLeftOut * drawing.draws, 'outside-validity-range', 'draws');
  return drawn;
}

function modelOf({ method, output, drawn, fixed = {} }: MethodDrawn, names: readonly string[]): Model {
  const inputs = Object.entries(drawn).map(([input, quantities]) => ({
    input,
    at: quantities.map((name) => indexOf(names, name)),
  }));
  return (values) => {
    const given: Record<string, GivenInputs[string]> = { ...fixed };
    for (const { input, at } of inputs) {
      given[input] = { value: at.reduce((product, index) => product * (values[index] ?? Number.NaN), 1) };
    }
    return reckoned(method, given, output);
  };
}

function indexOf(names: readonly string[], name: string): number {
  const index = names.indexOf(name);
  requireThat(index >= 0, 'unknown-input', name);
  return index;
}

/** NaN where the formula refuses. */
function reckoned(method: Method, given: GivenInputs, output: string): number {
  try {
    const value = method.run(given)[output];
    return typeof value === 'number' ? value : Number.NaN;
  } catch (refusal) {
    if (refusal instanceof OutsideDomain) return Number.NaN;
    throw refusal;
  }
}
