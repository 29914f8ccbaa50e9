import type { CaseAnswer } from '#shared/contracts/cases.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Json } from '../../../audit/record-act.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { ActName } from '../../../audit/act-table.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, rereadCase, type HeldFor } from '../../../rights/open-case.ts';
import { updateCase, type CaseValues } from '../queries/cases.ts';
import { presentWhole } from './load-case.ts';
import { requireSeenVersion } from './seen-version.ts';

export type CaseChange = {
  readonly act: ActName;
  readonly values: CaseValues;
  readonly before?: Json;
  readonly after?: Json;
  readonly reason?: string | null;
};

type Asked<Act extends CaseAct> = { heldCase: HeldFor<Act>; for: Act; versionSeen: number };

/**
 * One change of the case's own row: locked, the version compared, written and told in one transaction.
 * `change` sees the locked row and the transaction, and says what to write. Answers the case as it then stands.
 */
export function changeInCase<Act extends CaseAct>(
  context: Context,
  asked: Asked<Act>,
  change: (locked: HeldFor<Act>, tx: Transaction) => CaseChange | Promise<CaseChange>,
): Promise<CaseAnswer> {
  return context.inTransaction(async (tx) => {
    const locked = await lockCase(tx, context, asked.heldCase, asked.for);
    await requireSeenVersion(asked.versionSeen, {
      version: locked.version,
      what: `The case ${locked.number}`,
      current: () => presentWhole(tx, locked),
    });
    const { values, act, ...facts } = await change(locked, tx);
    await updateCase(tx, locked.id, values);
    await recordAct(tx, context.person, { act, inCase: locked, objectId: locked.id, ...facts });
    return presentWhole(tx, await rereadCase(tx, locked));
  });
}
