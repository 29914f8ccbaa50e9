import type { ConstantView } from '#shared/contracts/materials.ts';

export type RecordSpan = {
  readonly constant: ConstantView;
  /** First day in force, and the day the next took its place or today, as ms of UTC. */
  readonly fromMs: number;
  readonly toMs: number;
  readonly low: number;
  readonly high: number;
  readonly inForce: boolean;
};

const coverageFactor = 2;

/** Each record of one constant for as long as it was in force, oldest first, as high as its ± U (k = 2). */
export function recordsOverTime(records: readonly ConstantView[], today: string): RecordSpan[] {
  const inOrder = records.toSorted((a, b) => a.recordNumber - b.recordNumber);
  return inOrder.map((constant, index) => {
    const expanded = coverageFactor * constant.standardUncertainty;
    const next = inOrder[index + 1];
    return {
      constant,
      fromMs: Date.parse(constant.validFrom),
      toMs: Date.parse(next?.validFrom ?? today),
      low: constant.value - expanded,
      high: constant.value + expanded,
      inForce: next === undefined,
    };
  });
}

/** The records in force on a day, one a kind: of those that held then, the newest. */
export function inForceOn(records: readonly ConstantView[], day: string): ConstantView[] {
  const held = records.filter(({ validFrom }) => validFrom <= day);
  return held.filter(
    (record) => !held.some(({ kind, recordNumber }) => kind === record.kind && recordNumber > record.recordNumber),
  );
}
