import { describe, expect, it } from 'vitest';
import { methods } from '#shared/numeric/methods.ts';
import { agrees, checkValues, type CheckValue } from './check-values.ts';
import { notYet } from './not-yet.ts';
import { canRun, runCheckValue } from './run-check-value.ts';

// The methods that must be among those run, written out so that an empty table or an empty file fails.
const run = [
  'K.penny.gradient',
  'Y.corner.newmanRaju',
  'Y.edge.bending',
  'Y.edge.tension',
  'Y.embedded.Qapprox',
  'Y.embedded.ellipse',
  'Y.embedded.newmanRaju',
  'Y.surface.newmanRaju',
  'bend.chamfer2',
  'bend.chamfer4',
  'bend.round4',
  'bend3.rect',
  'bend3.rect.local',
  'bend3.rod',
  'bend3.rod.local',
  'bend4.rect',
  'bend4.rect.local',
  'bend4.rod',
  'bend4.rod.local',
  'bend4.rod.local.angle',
  'cantilever.rod',
  'compare.pair',
  'compare.pair.correlated',
  'compare.triple',
  'disc.pistonOnThreeBalls',
  'disc.pistonOnThreeBalls.local',
  'disc.ringOnRing',
  'disc.ringOnRing.local',
  'energy.bar',
  'error.friction3',
  'error.friction4',
  'error.largeDeflection3',
  'error.wedging3',
  'error.wedging4',
  'flaw.apparentToughness.embedded',
  'flaw.equivalentSemicircle',
  'flaw.pore.bracket',
  'flaw.size',
  'flaw.size.surface.bending',
  'flaw.stress',
  'gauge.consistency4',
  'gauge.meanMomentRatio3',
  'hertz.sphere',
  'hertz.sphere.radialDecay',
  'load.given',
  'mirror.averageRadius.ellipse',
  'mirror.averageRadius.surface',
  'mirror.fit.intercept',
  'mirror.fit.loglog',
  'mirror.fit.mean',
  'mirror.fit.origin',
  'mirror.flawRatio',
  'mirror.flawRatio.band',
  'mirror.gradientFactor',
  'mirror.radius',
  'mirror.residual',
  'mirror.stress',
  'mirror.uncertainty',
  'modulus.gauge4',
  'modulus.shearFactor3',
  'modulus.slope3',
  'modulus.slope4.loadpoint',
  'modulus.slope4.midspan',
  'montecarlo.mirror',
  'originCode.parse',
  'plate.supported.pressure',
  'scg.apparentToughness',
  'scg.fullConstantRate',
  'scg.rateCorrection',
  'scg.staticLife',
  'strain.deflection3',
  'strain.deflection4.loadpoint',
  'strain.deflection4.midspan',
  'strain.deflection4.relative',
  'strainRate.crosshead3',
  'strainRate.crosshead4',
  'thermal.plateBiot',
  'thermal.plateInstant',
  'thermal.psi',
  'uncertainty.bend3.local',
  'uncertainty.bend4.nominal',
  'uncertainty.flaw',
  'uncertainty.ringOnRing',
  'validity.breakLocation4',
  'validity.specimen',
];

const testable = checkValues.filter((entry) => canRun(entry.method));
const waiting = checkValues.filter((entry) => notYet.includes(entry.method));

describe('the reference values', () => {
  it('cover exactly the methods named here', () => {
    expect([...new Set(testable.map((entry) => entry.method))].sort()).toEqual(run);
  });

  it('cover every method of the table', () => {
    const referenced = new Set(checkValues.map((entry) => entry.method));
    expect(methods.map((method) => method.id).filter((id) => !referenced.has(id))).toEqual([]);
  });

  it(`leave ${waiting.length} entries of ${notYet.length} methods waiting, each listed, none of them computed by now`, () => {
    expect(notYet.filter(canRun)).toEqual([]);
    expect(testable.length + waiting.length).toBe(checkValues.length);
    const referenced = new Set(checkValues.map((entry) => entry.method));
    expect(notYet.filter((method) => !referenced.has(method))).toEqual([]);
  });
});

describe('the numbers agree with the reference', () => {
  it.each(testable.map((entry): [string, string, CheckValue] => [entry.id, entry.method, entry]))(
    '%s %s',
    (_id, _method, entry) => {
      const answer = runCheckValue(entry);
      for (const [name, { value }] of Object.entries(entry.expected)) {
        expect(
          agrees(answer[name], value, entry.tolerance),
          `${name}: ${String(answer[name])} for ${String(value)}`,
        ).toBe(true);
      }
    },
  );
});
