import type { FindingsFacts as Facts } from '#shared/contracts/findings.ts';
import type { Reader, Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { insertTempVersion } from '../queries/temp-findings.ts';
import type { HeldCase } from '../queries/closures.ts';

export type FindingsFacts = Facts & { text: string };
export function findFindingsFacts(_reader: Reader, _heldCase: HeldCase): Promise<FindingsFacts> {
  return Promise.resolve({ wordCount: 3, staleBoundValues: [], figures: 0, unresolved: 0, emptyParts: [], text: '' });
}
export function keepFindingsVersion(tx: Transaction, context: Context, heldCase: HeldCase, name: string) {
  return insertTempVersion(tx, context.person.id, heldCase.id, name);
}
