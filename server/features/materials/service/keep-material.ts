import type {
  MaterialChanged,
  MaterialEntered,
  MaterialView,
  MaterialWithConstants,
} from '#shared/contracts/materials.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { listRecords } from '../queries/constants.ts';
import { findMaterial, insertMaterial, lockMaterial, selectMaterials, updateMaterial } from '../queries/materials.ts';
import { presentConstant, presentMaterial } from '../present.ts';

/** Every material, by name. */
export async function listMaterials(reader: Reader): Promise<MaterialView[]> {
  return (await selectMaterials(reader)).map(presentMaterial);
}

/** A material with every record of its constants. @throws Problem not-found */
export function loadMaterial(context: Pick<Context, 'inTransaction'>, id: string): Promise<MaterialWithConstants> {
  return context.inTransaction(async (tx) => {
    const row = await findMaterial(tx, id);
    if (!row) throw nothingHere();
    const records = await listRecords(tx, id);
    return { ...presentMaterial(row), constants: records.map(presentConstant), asOf: tx.at.toISOString() };
  });
}

export function enterMaterial(context: Context, entered: MaterialEntered): Promise<MaterialView> {
  return context.inTransaction(async (tx) => {
    const { id } = await insertMaterial(tx, entered);
    await recordAct(tx, context.person, { act: 'material.entered', objectId: id, after: entered });
    return { ...entered, id, constantsInForce: 0, version: 1 };
  });
}

/** Changes what a material is called and how it is made; its constants are records of their own. */
export function changeMaterial(context: Context, id: string, { versionSeen, ...values }: MaterialChanged) {
  return context.inTransaction(async (tx): Promise<MaterialView> => {
    const before = await lockMaterial(tx, id);
    if (!before) throw nothingHere();
    if (before.version !== versionSeen)
      throw new Problem('stale-version', `${before.name} was changed while you wrote.`, {
        stillHolds: 'Nothing of yours is lost: both versions stand here side by side.',
        current: presentMaterial(before),
      });
    const { name, family, route, grainSizeUm, note } = before;
    const was = { name, family, route, grainSizeUm, note };
    await updateMaterial(tx, id, values);
    const act = { act: 'material.changed', objectId: id, before: was, after: { ...was, ...values } } as const;
    await recordAct(tx, context.person, act);
    return { ...before, ...values, version: before.version + 1 };
  });
}
