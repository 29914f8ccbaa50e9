import type { ConstantReach, ConstantView, MaterialView } from '#shared/contracts/materials.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import type { RecordRef } from '../../lineage/lineage.ts';
import type { ConstantRow } from './queries/constants.ts';
import type { findMaterial } from './queries/materials.ts';
import type { CaseReached } from './queries/reach.ts';

export type MaterialRow = NonNullable<Awaited<ReturnType<typeof findMaterial>>>;

export function presentMaterial(row: MaterialRow): MaterialView {
  return row;
}

export function presentConstant({ constant, madeByName, supersededById }: ConstantRow): ConstantView {
  const { madeBy, madeAt, enteredUnit: _enteredUnit, ...shown } = constant;
  return {
    ...shown,
    unit: constantKindTable[constant.kind].unit,
    supersededById,
    madeBy: { id: madeBy, name: madeByName },
    madeAt: madeAt.toISOString(),
  };
}

export function presentReach(dependents: readonly RecordRef[], cases: readonly CaseReached[]): ConstantReach {
  const countOf = (kind: RecordRef['kind']) => dependents.filter((record) => record.kind === kind).length;
  return {
    estimates: countOf('estimate'),
    boundValues: countOf('bound value'),
    cases: cases.length,
    closedCases: cases.filter(({ state }) => state === 'closed').length,
    casesSeen: cases
      .filter(({ seen }) => seen)
      .map(({ number, state, estimates }) => ({ number: CaseNumber.parse(number), state, estimates })),
  };
}
