import type { ConstantReach, ConstantView } from '#shared/contracts/materials.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { listDependents } from '../../../lineage/lineage.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { findRecord, listRecords } from '../queries/constants.ts';
import { listCasesReached } from '../queries/reach.ts';
import { presentConstant, presentReach } from '../present.ts';

/**
 * The constants of a material in force, one a kind: now, or as they stood on a day. Of the records that held on that
 * day the newest counts.
 */
export async function listConstantsInForce(reader: Reader, materialId: string, on?: string): Promise<ConstantView[]> {
  const records = await listRecords(reader, materialId, on);
  return records
    .filter((record, index) => records[index - 1]?.constant.kind !== record.constant.kind)
    .map(presentConstant);
}

/** A record of a constant, in force or not. @throws Problem not-found */
export async function loadConstant(reader: Reader, id: string): Promise<ConstantView> {
  const record = await findRecord(reader, id);
  if (!record) throw nothingHere();
  return presentConstant(record);
}

/** What hangs on a record: what would be stale if another came into force. Cases not seen are counted, not named. */
export async function loadReach(
  { reader, person }: Pick<Context, 'reader' | 'person'>,
  { materialId, constantId }: { materialId: string; constantId: string },
): Promise<ConstantReach> {
  const constant = await loadConstant(reader, constantId);
  if (constant.materialId !== materialId) throw nothingHere();
  const dependents = await listDependents(reader, { kind: 'material constant', id: constantId });
  const cases = await listCasesReached(
    reader,
    person,
    dependents.map(({ id }) => id),
  );
  return presentReach(dependents, cases);
}
