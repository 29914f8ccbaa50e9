import { describe, expect, it } from 'vitest';
import { contactStressOutsideMPa } from './contact-stress-outside.ts';
import { sphereContact } from './sphere-contact.ts';

const contact = {
  loadN: 100,
  radiusMm: 2.5,
  sphereModulusGPa: 80,
  spherePoissonRatio: 0.25,
  partModulusGPa: 80,
  partPoissonRatio: 0.25,
};
const place = { edgeTensileStressMPa: 300, contactRadiusMm: 0.1, distanceMm: 0.2 };

describe('the contact of a sphere', () => {
  it('of equal bodies has E* = E / (2(1 − ν²)) and carries the load: 2/3 p₀ π a² = P', () => {
    const { effectiveModulusGPa, contactRadiusMm, peakPressureMPa } = sphereContact(contact);
    expect(effectiveModulusGPa).toBeCloseTo(80 / (2 * 0.9375), 10);
    expect(contactRadiusMm ** 3).toBeCloseTo((3 * 100 * 2.5) / (4 * effectiveModulusGPa * 1000), 12);
    expect((2 / 3) * peakPressureMPa * Math.PI * contactRadiusMm ** 2).toBeCloseTo(100, 9);
  });

  it('pulls at its edge with (1 − 2ν)P / (2πa²), and not at all in a body that keeps its volume', () => {
    const { contactRadiusMm, edgeTensileStressMPa } = sphereContact(contact);
    expect(edgeTensileStressMPa).toBeCloseTo((0.5 * 100) / (2 * Math.PI * contactRadiusMm ** 2), 9);
    expect(sphereContact({ ...contact, partPoissonRatio: 0.4999999 }).edgeTensileStressMPa).toBeLessThan(1e-3);
  });

  it('pulls twice as much at eight times the load', () => {
    const once = sphereContact(contact).edgeTensileStressMPa;
    expect(sphereContact({ ...contact, loadN: 800 }).edgeTensileStressMPa).toBeCloseTo(2 * once, 9);
  });

  it('without load has neither size nor stress', () => {
    expect(sphereContact({ ...contact, loadN: 0 })).toMatchObject({ contactRadiusMm: 0, edgeTensileStressMPa: 0 });
  });

  it.each([
    [{ loadN: Number.NaN }, 'non-finite-input', 'loadN'],
    [{ radiusMm: 0 }, 'non-positive-dimension', 'radiusMm'],
    [{ partModulusGPa: 0 }, 'outside-validity-range', 'partModulusGPa'],
    [{ spherePoissonRatio: 0.5 }, 'poisson-out-of-range', 'spherePoissonRatio'],
    [{ partPoissonRatio: -0.1 }, 'poisson-out-of-range', 'partPoissonRatio'],
    [{ loadN: -1 }, 'negative-load', 'loadN'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => sphereContact({ ...contact, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});

describe('the stress outside a contact', () => {
  it('is a quarter at twice the radius, and whole at the edge', () => {
    expect(contactStressOutsideMPa(place)).toBeCloseTo(75, 12);
    expect(contactStressOutsideMPa({ ...place, distanceMm: 0.1 })).toBe(300);
  });

  it.each([
    [{ distanceMm: Number.NaN }, 'non-finite-input', 'distanceMm'],
    [{ contactRadiusMm: 0 }, 'non-positive-dimension', 'contactRadiusMm'],
    [{ edgeTensileStressMPa: 0 }, 'non-positive-stress', 'edgeTensileStressMPa'],
    [{ distanceMm: 0.099 }, 'outside-validity-range', 'distanceMm'],
  ])('is refused for %o', (wrong, code, field) => {
    expect(() => contactStressOutsideMPa({ ...place, ...wrong })).toThrow(expect.objectContaining({ code, field }));
  });
});
