import { describe, expect, it } from 'vitest';
import { parseQuantity, type QuantityWanted } from './parse-quantity.ts';
import { ourUnitOf } from './our-units.ts';
import { unitTable } from './unit-table.ts';

const length: QuantityWanted = { kind: 'length', openUnit: true };
const force: QuantityWanted = { kind: 'force', openUnit: true };
const stress: QuantityWanted = { kind: 'stress', openUnit: true };
const toughness: QuantityWanted = { kind: 'toughness', openUnit: true };
const mass: QuantityWanted = { kind: 'mass', openUnit: true };
const factor: QuantityWanted = { kind: 'dimensionless', openUnit: false };
const of = (kind: QuantityWanted['kind']): QuantityWanted => ({ kind, openUnit: true });

function valueOf(text: string, wanted: QuantityWanted): number {
  const answer = parseQuantity(text, wanted);
  return answer.kind === 'read' ? answer.value : Number.NaN;
}

function reasonOf(text: string, wanted: QuantityWanted): string {
  const answer = parseQuantity(text, wanted);
  return answer.kind === 'refused' ? answer.reason : `read as ${answer.value}`;
}

describe('a typed quantity', () => {
  it.each([
    // 0.118 × 25.4
    ['0.118 in', length, 2.9972],
    ['0.118"', length, 2.9972],
    ['4,01 mm', length, 4.01],
    ['4.01mm', length, 4.01],
    ['560 µm', length, 0.56],
    ['560 μm', length, 0.56],
    ['560um', length, 0.56],
    ['12 nm', length, 1.2e-5],
    ['4 cm', length, 40],
    ['5 mil', length, 0.127],
    ['1e-3 m', length, 1],
    ['−3.2 mm', length, -3.2],
    ['- 3.2 mm', length, -3.2],
    ['.5 mm', length, 0.5],
    ['0,118 in', length, 2.9972],
    // 88.35 × 4.4482216152605
    ['88.35 lbf', force, 393.00038],
    ['2 kgf', force, 19.6133],
    ['0.421 kN', force, 421],
    ['1 234,5 N', force, 1234.5],
    ['1,234.5 N', force, 1234.5],
    ['1.234,5 N', force, 1234.5],
    ['1,234,567 N', force, 1_234_567],
    ['50 ksi', stress, 344.7379],
    ['1 bar', stress, 0.1],
    ['1 GPa', stress, 1000],
    ['1 kgf/mm²', stress, 9.80665],
    ['3.5 MPa√m', toughness, 3.5],
    ['3.5 MPa m½', toughness, 3.5],
    ['3.5 MPa m^0.5', toughness, 3.5],
    ['3.5 MPa*sqrt(m)', toughness, 3.5],
    // 1 ksi√in = 6.894757 × √0.0254
    ['1 ksi√in', toughness, 1.0988435],
    // 1 N/mm^1.5 = 1 MPa√mm = √0.001 MPa√m
    ['100 N/mm^1.5', toughness, 3.1622777],
    ['6.412 kg', mass, 6412],
    ['11,8 g', mass, 11.8],
    ['250mg', mass, 0.25],
    ['1.29', factor, 1.29],
    ['5 %', factor, 0.05],
    // the same spelling is a modulus where one is wanted
    ['70 GPa', of('modulus'), 70],
    ['70000 MPa', of('modulus'), 70],
    // 10 × 6.894757
    ['10 Msi', of('modulus'), 68.9476],
    ['0.5 MPa/s', of('stressRate'), 0.5],
    ['266 N/mm³', of('stressGradient'), 266],
    ['45°', of('angle'), 45],
    ['0.5 rad', of('angle'), 28.6479],
    ['2 h', of('time'), 7200],
    ['10 µm/s', of('speed'), 0.6],
    ['0.02 in/min', of('speed'), 0.508],
    ['2.1 kN/mm', of('stiffness'), 2100],
    // 100 × 4.4482216 / 25.4
    ['100 lbf/in', of('stiffness'), 17.5127],
    ['0.02 µm/N', of('compliance'), 2e-5],
    ['90 °F', of('temperatureDifference'), 50],
    ['60 °C', of('temperatureDifference'), 60],
    ['8.5 ppm/K', of('expansion'), 8.5e-6],
    ['9e-6 /K', of('expansion'), 9e-6],
    ['2000 W/(m² K)', of('heatTransfer'), 2000],
    ['30 W/m/K', of('conductivity'), 30],
    ['0.5 MPa² s', of('growthConstant'), 0.5],
    ['150 MPa^2', of('stressSquared'), 150],
  ])('%s is read', (text, wanted, value) => {
    expect(valueOf(text, wanted)).toBeCloseTo(value, value < 1 ? 9 : 4);
  });

  it('is kept as typed beside its value', () => {
    const answer = parseQuantity('0.118 inch', length);
    const typed = { text: '0.118 inch', number: 0.118, unit: 'in' };
    expect(answer).toMatchObject({ kind: 'read', unit: 'mm', typed });
  });

  it('without a unit takes the usual one where that is allowed', () => {
    expect(parseQuantity('560', { kind: 'length', openUnit: false, defaultUnit: 'µm' })).toMatchObject({ value: 0.56 });
    expect(valueOf('4', { kind: 'length', openUnit: false })).toBe(4);
  });
});

describe('a typed quantity is refused with the reason', () => {
  it.each([
    ['88.35', force, '88.35 has no unit: say N, kN, lbf, kgf or gf.'],
    ['88.35 lb', force, 'lb is a unit of mass: say lbf for a force.'],
    ['9 kg', force, 'kg is a unit of mass: say kgf for a force.'],
    ['1,234 N', force, '1,234 could be 1.234 or 1234: type it with a point or without the comma.'],
    ['50 psi', length, 'psi is a unit of stress, and a length is wanted here: say mm, µm, nm, cm, m, in or mil.'],
    ['4 lb', length, 'lb is a unit of mass, and a length is wanted here: say mm, µm, nm, cm, m, in or mil.'],
    ['4 mPa', stress, '“mPa” is not a unit known here: say MPa, Pa, kPa, GPa, psi, ksi, bar or kgf/mm².'],
    ['4 lb', mass, '“lb” is not a unit known here: say g, kg or mg.'],
    ['4 N', mass, 'N is a unit of force, and a mass is wanted here: say g, kg or mg.'],
    ['4 mm', factor, 'mm is a unit of length, and a plain number is wanted here.'],
    ['4 mm', of('angle'), 'mm is a unit of length, and an angle is wanted here: say ° or rad.'],
    ['4', of('growthConstant'), '4 has no unit: say MPa²·s.'],
    ['1.2.3 mm', length, '“1.2.3” is not a number that can be read.'],
    ['3 1/4 in', length, '“3 1” is not a number that can be read.'],
    ['', factor, 'Type a number.'],
    ['about 3 mm', length, 'Type a number with its unit, mm, µm, nm, cm, m, in or mil.'],
  ])('%s', (text, wanted, reason) => {
    expect(reasonOf(text, wanted)).toBe(reason);
  });

  it('when the number is too large to hold', () => {
    expect(reasonOf('1e999 mm', length)).toContain('not a number that can be read');
  });
});

describe('the table of units', () => {
  it('spells no two units of a kind alike', () => {
    const spellings = unitTable.flatMap((unit) => unit.spellings.map((spelling) => `${unit.kind} ${spelling}`));
    expect(new Set(spellings).size).toBe(spellings.length);
  });

  it('holds our own unit of each kind with factor 1', () => {
    for (const unit of Object.values(ourUnitOf)) {
      expect(unitTable.filter((each) => each.spellings.includes(unit)).map((each) => each.factor)).toContain(1);
    }
  });
});
