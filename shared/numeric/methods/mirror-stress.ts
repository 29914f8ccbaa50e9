import { mirrorStressMPa } from '../mirror/mirror-stress.ts';
import { mirrorSensitivities } from '../uncertainty/mirror-sensitivities.ts';
import { numberGiven, optionalNumberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';

// Radius over depth up to which the stress gradient changes the reading by at most 4 %, and above which it is no reading.
const smallMirror = 0.1;
const largeMirror = 0.3;
// Radius over flaw size below which the constant stops being one: trade practice.
const leastRadiusOverFlaw = 5;

const mirror = (given: GivenInputs) => ({
  mirrorConstantMPaRootM: numberGiven(given, 'A'),
  radiusMm: numberGiven(given, 'R'),
});

function cautions(given: GivenInputs): Caution[] {
  const found: Caution[] = [];
  const radius = numberGiven(given, 'R');
  const depth = optionalNumberGiven(given, 'depth');
  const flaw = optionalNumberGiven(given, 'c');
  if (depth !== undefined && radius / depth > smallMirror) {
    const ratio = (radius / depth).toFixed(2);
    const large = radius / depth > largeMirror;
    const sentence = large
      ? `Large mirror: the radius is ${ratio} of the depth. Choose the reading with gradient, a bound, or set the line aside.`
      : `The radius is ${ratio} of the depth, above ${smallMirror}: the fall of stress into the section makes the mirror read low.`;
    found.push({ code: large ? 'large-mirror' : 'mirror-in-gradient', weight: large ? 'warning' : 'note', sentence });
  }
  if (flaw !== undefined && radius / flaw < leastRadiusOverFlaw) {
    const ratio = (radius / flaw).toFixed(1);
    const sentence = `The radius is only ${ratio} times the flaw size: below ${leastRadiusOverFlaw} the mirror constant no longer holds.`;
    found.push({ code: 'flaw-large-against-mirror', weight: 'warning', sentence });
  }
  return found;
}

const optionalLength = {
  kind: 'number',
  unit: 'mm',
  unitKind: 'length',
  openUnit: true,
  uncertainty: 'none',
  optional: true,
} as const;

export const mirrorStress: Method = {
  id: 'mirror.stress',
  version: 1,
  line: 'mirror',
  title: 'Stress from the mirror radius',
  inputs: [
    {
      kind: 'number',
      name: 'A',
      label: 'Mirror constant',
      symbol: 'A',
      unit: 'MPa√m',
      unitKind: 'toughness',
      argument: 'mirrorConstantMPaRootM',
      limits: 'more than 0; of the same boundary as the radius',
      openUnit: true,
      uncertainty: 'expected',
    },
    {
      kind: 'number',
      name: 'R',
      label: 'Mirror radius',
      symbol: 'R',
      unit: 'mm',
      unitKind: 'length',
      argument: 'radiusMm',
      limits: 'more than 0; from the origin, along the tensile face in a bent bar',
      openUnit: true,
      uncertainty: 'expected',
    },
    {
      ...optionalLength,
      name: 'depth',
      label: 'Depth of the section',
      symbol: 'd',
      argument: 'depthMm',
      limits: 'more than 0; for a bent part, to tell whether the mirror is large',
    },
    {
      ...optionalLength,
      name: 'c',
      label: 'Flaw size',
      symbol: 'c',
      argument: 'flawSizeMm',
      limits: 'more than 0; to tell whether the mirror is large enough against the flaw',
    },
  ],
  outputs: [{ name: 'stress', label: 'Total stress at the origin', symbol: 'σ', unit: 'MPa' }],
  mainOutput: 'stress',
  formula: { symbols: 'A / √R', template: () => '{A} / √({R@m})' },
  source: { text: 'Mirror relation σ√R = A', tag: 'looked up' },
  run: (given) => ({ stress: mirrorStressMPa(mirror(given)) }),
  sensitivities: (given) => mirrorSensitivities(mirror(given)),
  cautions,
};
