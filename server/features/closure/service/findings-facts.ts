import type { Reader, Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { insertTempVersion } from '../queries/temp-findings.ts';
import type { HeldCase } from '../queries/closures.ts';

export type FindingsFacts = {
  outline: readonly { title: string; isEmpty: boolean }[];
  staleValues: number;
  staleFigures: number;
  unresolved: number;
  text: string;
};
export function findFindingsFacts(_reader: Reader, _heldCase: HeldCase): Promise<FindingsFacts> {
  return Promise.resolve({
    outline: [{ title: 'What was asked', isEmpty: false }],
    staleValues: 0,
    staleFigures: 0,
    unresolved: 0,
    text: '',
  });
}
export function keepFindingsVersion(tx: Transaction, context: Context, heldCase: HeldCase, name: string) {
  return insertTempVersion(tx, context.person.id, heldCase.id, name);
}
