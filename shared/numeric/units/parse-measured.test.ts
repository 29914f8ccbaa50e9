import { describe, expect, it } from 'vitest';
import { parseMeasured } from './parse-measured.ts';

const mass = { kind: 'mass', openUnit: true } as const;

describe('a measured mass as it is typed', () => {
  it.each([
    ['6.412 kg ± 5 g', 6412, 5],
    ['6.412 ± 0.005 kg', 6412, 5],
    ['11,8 g +/- 0,1 g', 11.8, 0.1],
    ['250 mg +- 2 mg', 0.25, 0.002],
  ])('%s is read with its interval', (text, value, uncertainty) => {
    const read = parseMeasured(text, mass);
    if (read.kind === 'refused') throw new Error(read.reason);
    expect(read.value).toBeCloseTo(value, 9);
    expect(read.expandedUncertainty).toBeCloseTo(uncertainty, 9);
    expect(read.typed.text).toBe(text);
  });

  it.each([
    ['6.412 kg', 'Say how sure it is, with its unit: 6.412 kg ± …'],
    ['6.412 ± 0.005', '0.005 has no unit: say g, kg or mg.'],
    ['6.412 kg ± 0 g', 'The ± of 6.412 kg must be more than nothing.'],
    ['6.412 kg ± 5 mm', 'mm is a unit of length, and a mass is wanted here: say g, kg or mg.'],
    ['', 'Say how sure it is, with its unit: 6.412 kg ± 5 g'],
  ])('%s is refused with the reason', (text, reason) => {
    expect(parseMeasured(text, mass)).toEqual({ kind: 'refused', reason });
  });
});
