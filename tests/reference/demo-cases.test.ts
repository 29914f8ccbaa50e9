import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '#shared/numeric/evaluate-method.ts';
import type { GivenInputs } from '#shared/numeric/methods/method.ts';
import type { Estimated } from '#shared/numeric/uncertainty/estimated.ts';
import { judgeAgreement, type LineReading } from '#shared/rules/agreement.ts';

// The demonstration cases on bars and the ring, worked out from what was entered. The expected values are printed to one
// decimal, and lengths on them are rounded to a micrometre: 0.1 MPa in the value, 0.2 MPa in U (k = 2).

/** From U with k = 2, as constants are stated. */
const stated = (value: number, expanded: number) => ({ value, standardUncertainty: expanded / 2 });
const relative = (value: number, fraction: number) => ({ value, standardUncertainty: value * fraction });
const within = (value: number, standardUncertainty: number) => ({ value, standardUncertainty });
const mmFromUm = (um: number) => um / 1000;

// Alumina, MPa√m
const toughness = stated(3.5, 0.2);
const outerMirrorConstant = stated(8.5, 0.6);
const surfaceHalfRound = 1.29;
const interiorRound = 1.128;

/** Bars 3 × 4: load in N with 1.73 %, spans 40/20 mm ± 0.1, section in mm ± 0.01. */
function fourPointBar(loadN: number, widthMm: number, depthMm: number): GivenInputs {
  return {
    load: relative(loadN, 0.0173),
    outerSpan: within(40, 0.1),
    innerSpan: within(20, 0.1),
    width: within(widthMm, 0.01),
    depth: within(depthMm, 0.01),
  };
}
const belowFace = (depthUm: number) => ({ x: within(0, 0), y: within(mmFromUm(depthUm), 0.0125) });
const mirror = (radiusUm: number, fraction: number): GivenInputs => ({
  A: outerMirrorConstant,
  R: relative(mmFromUm(radiusUm), fraction),
});
const flaw = (shapeFactor: number, sizeUm: number, shapeFraction: number, sizeFraction: number): GivenInputs => ({
  KIc: toughness,
  Y: relative(shapeFactor, shapeFraction),
  c: relative(mmFromUm(sizeUm), sizeFraction),
});

type Expected = readonly [valueMPa: number, expandedMPa: number];

function estimateOf(method: string, given: GivenInputs): Estimated {
  const answer = evaluateMethod(method, 1, given);
  if (answer.kind !== 'value' || !answer.estimated) throw new Error(`No estimate by ${method}`);
  return answer.estimated;
}

const cases: readonly (readonly [string, string, GivenInputs, Expected])[] = [
  ['0001 load', 'bend4.rect', fourPointBar(421, 4.01, 3.0), [350.0, 14.0]],
  ['0001 mirror, 1018 px of 0.5500 µm', 'mirror.stress', mirror(1018 * 0.55, 0.06), [359.2, 33.3]],
  ['0001 flaw, 116.4 px of 0.5500 µm', 'flaw.stress', flaw(surfaceHalfRound, 116.4 * 0.55, 0.06, 0.1), [339.1, 56.4]],
  ['0001 mirror, 1018 px of 0.5599 µm', 'mirror.stress', mirror(1018 * 0.5599, 0.06), [356.0, 33.0]],
  ['0001 flaw, 116.4 px of 0.5599 µm', 'flaw.stress', flaw(surfaceHalfRound, 116.4 * 0.5599, 0.06, 0.1), [336.1, 55.9]],
  ['0002 mirror', 'mirror.stress', mirror(1880, 0.06), [196.0, 18.2]],
  ['0002 flaw', 'flaw.stress', flaw(surfaceHalfRound, 215, 0.08, 0.12), [185.0, 38.5]],
  ['0003 load, 300 µm deep', 'bend4.rect.local', { ...fourPointBar(279, 4.03, 2.98), ...belowFace(300) }, [186.8, 8.4]],
  ['0003 mirror', 'mirror.stress', mirror(1950, 0.06), [192.5, 17.8]],
  ['0003 flaw', 'flaw.stress', flaw(interiorRound, 195, 0.08, 0.12), [222.2, 46.2]],
  ['0004 first load', 'bend4.rect', fourPointBar(372, 4.01, 2.99), [311.3, 12.5]],
  ['0004 first mirror', 'mirror.stress', mirror(900, 0.06), [283.3, 26.2]],
  ['0004 first flaw', 'flaw.stress', flaw(surfaceHalfRound, 36, 0.06, 0.1), [452.2, 75.2]],
  [
    '0004 second load, 180 µm deep',
    'bend4.rect.local',
    { ...fourPointBar(372, 4.01, 2.99), ...belowFace(180) },
    [273.8, 12.1],
  ],
  ['0004 second mirror', 'mirror.stress', mirror(930, 0.06), [278.7, 25.8]],
  ['0004 second flaw', 'flaw.stress', flaw(interiorRound, 115, 0.08, 0.12), [289.3, 60.2]],
];

describe('the demonstration cases', () => {
  it.each(cases)('%s', (_name, method, given, [valueMPa, expandedMPa]) => {
    const estimated = estimateOf(method, given);
    expect(Math.abs(estimated.value - valueMPa)).toBeLessThanOrEqual(0.1);
    expect(Math.abs(2 * estimated.standardUncertainty - expandedMPa)).toBeLessThanOrEqual(0.2);
  });
});

function line(name: LineReading['line'], startOfName: string): LineReading {
  const found = cases.find(([title]) => title.startsWith(startOfName));
  if (!found) throw new Error(`No case ${startOfName}`);
  const { value, standardUncertainty } = estimateOf(found[1], found[2]);
  return { line: name, stressMPa: value, standardUncertaintyMPa: standardUncertainty, setAside: false, shared: [] };
}

describe('the verdicts of the demonstration cases', () => {
  it('agree on bar 0001', () => {
    const lines = [line('load', '0001 load'), line('mirror', '0001 mirror'), line('flaw', '0001 flaw')];
    expect(judgeAgreement(lines)).toMatchObject({ verdict: 'agree', pattern: { kind: 'all-agree' } });
  });

  it('agree on ring 0002 with two lines', () => {
    const lines = [line('mirror', '0002 mirror'), line('flaw', '0002 flaw')];
    expect(judgeAgreement(lines)).toMatchObject({ verdict: 'agree', pattern: null });
  });

  it('agree on bar 0003', () => {
    const lines = [line('load', '0003 load'), line('mirror', '0003 mirror'), line('flaw', '0003 flaw')];
    expect(judgeAgreement(lines).verdict).toBe('agree');
  });

  it('disagree on the first reading of bar 0004, with the flaw alone high', () => {
    const lines = [
      line('load', '0004 first load'),
      line('mirror', '0004 first mirror'),
      line('flaw', '0004 first flaw'),
    ];
    expect(judgeAgreement(lines)).toMatchObject({
      verdict: 'disagree',
      pattern: { kind: 'outlier', line: 'flaw', side: 'high' },
    });
  });

  it('agree on the second reading of bar 0004', () => {
    const lines = [
      line('load', '0004 second load'),
      line('mirror', '0004 second mirror'),
      line('flaw', '0004 second flaw'),
    ];
    expect(judgeAgreement(lines).verdict).toBe('agree');
  });
});
