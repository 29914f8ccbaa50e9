import { describe, expect, it } from 'vitest';
import type { ConstantView } from '#shared/contracts/materials.ts';
import { inForceOn, recordsOverTime } from './records-over-time.ts';

const record = (recordNumber: number, value: number, validFrom: string): ConstantView => ({
  ...{ id: `01990000-0000-7000-8000-00000000000${recordNumber}`, materialId: '01990000-0000-7000-8000-000000000000' },
  ...{
    recordNumber,
    kind: 'toughness',
    value,
    standardUncertainty: 0.1,
    unit: 'MPa√m',
    enteredText: '',
    source: 'paper',
  },
  ...{ sourceStanding: 'own test', condition: null, validFrom, reason: null, supersedesId: null, supersededById: null },
  ...{ madeBy: { id: '01990000-0000-7000-8000-000000000000', name: 'Lab Engineer' }, madeAt: '2026-05-04T10:00:00Z' },
});
const records = [record(2, 3.5, '2025-06-01'), record(1, 3.9, '2024-03-12')];

describe('the records of a constant', () => {
  it('each stand until the next takes their place, as high as their ± at k = 2', () => {
    const [first, second] = recordsOverTime(records, '2026-10-19');
    expect(first).toMatchObject({
      toMs: Date.parse('2025-06-01'),
      low: expect.closeTo(3.7, 9),
      high: expect.closeTo(4.1, 9),
      inForce: false,
    });
    expect(second).toMatchObject({ toMs: Date.parse('2026-10-19'), inForce: true });
  });

  it('are read as they stood on a day', () => {
    expect(inForceOn(records, '2025-05-31').map(({ value }) => value)).toEqual([3.9]);
    expect(inForceOn(records, '2025-06-01').map(({ value }) => value)).toEqual([3.5]);
    expect(inForceOn(records, '2024-03-11')).toEqual([]);
  });
});
