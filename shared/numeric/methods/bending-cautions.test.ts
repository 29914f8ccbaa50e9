import { describe, expect, it } from 'vitest';
import { evaluateMethod } from '../evaluate-method.ts';

function cautionsOf(id: string, numbers: Readonly<Record<string, number>>): string[] {
  const given = Object.fromEntries(Object.entries(numbers).map(([name, value]) => [name, { value }]));
  const answer = evaluateMethod(id, 1, given);
  return answer.kind === 'value' ? answer.cautions.map(({ code }) => code) : [`refused: ${answer.code}`];
}

const rod = { load: 690, outerSpan: 40, innerSpan: 20, diameter: 4, x: 0, y: 0 };
const disc = { load: 1000, thickness: 2, poisson: 0.22, supportDiameter: 30, loadDiameter: 10, discDiameter: 36 };
const gauged = { load: 300, outerSpan: 40, innerSpan: 20, width: 4, depth: 3, gaugeStrain: 0.0008 };
const slope = { slope: 2100, outerSpan: 40, width: 4, depth: 3 };

describe('what is said beside a number from bending', () => {
  it.each([
    ['bend4.rod.local', rod, []],
    ['bend4.rod.local', { ...rod, y: 3 }, ['origin-in-compression']],
    ['bend4.rod.local', { ...rod, x: 11 }, ['outside-inner-span', 'contact-zone']],
    ['bend3.rod', { load: 0, outerSpan: 20, diameter: 4 }, ['zero-load', 'short-span']],
    ['disc.ringOnRing', disc, []],
    ['disc.ringOnRing', { ...disc, loadDiameter: 16 }, ['ring-proportion']],
    ['disc.ringOnRing', { ...disc, thickness: 3.1 }, ['thick-disc', 'disc-overhang']],
    ['disc.ringOnRing.local', { ...disc, radius: 6 }, ['contact-zone']],
    ['bend.chamfer4', { width: 4, depth: 3, chamferLeg: 0.09 }, []],
    ['bend.chamfer4', { width: 4, depth: 3, chamferLeg: 0.12 }, ['correct-edges']],
    ['strain.deflection3', { depth: 3, deflection: 1.2, outerSpan: 40 }, []],
    ['strain.deflection3', { depth: 3, deflection: 1.3, outerSpan: 40 }, ['large-deflection']],
    ['strain.deflection3', { depth: 3, deflection: 4.1, outerSpan: 40 }, ['refused: outside-validity-range']],
    ['modulus.slope3', slope, ['apparent-modulus']],
    ['modulus.slope3', { ...slope, machineCompliance: 2e-5 }, []],
    ['gauge.consistency4', { ...gauged, modulus: 312.5 }, []],
    ['gauge.consistency4', { ...gauged, modulus: 325 }, ['gauge-differs']],
    ['gauge.consistency4', { ...gauged, modulus: 290 }, ['gauge-disagrees']],
    ['validity.breakLocation4', { outerSpan: 40, innerSpan: 20, x: -12.5 }, ['outside-inner-span']],
    ['validity.breakLocation4', { outerSpan: 40, innerSpan: 20, x: 9, depth: 3 }, ['contact-zone', 'wedging']],
  ])('of %s for %o is %o', (id, numbers, codes) => {
    expect(cautionsOf(id, numbers)).toEqual(codes);
  });
});
