import type { PartDetails, PartView } from '#shared/contracts/evidence.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentPart } from '../present.ts';
import { insertPart } from '../queries.ts';
import { loadPart, requireMaterial } from './must-be-there.ts';

/** Enters what broke: a part or specimen of the case. */
export function enterPart(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  details: PartDetails,
): Promise<PartView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    await requireMaterial(tx, details.materialId);
    const { id } = await insertPart(tx, { ...details, caseId: heldCase.id, madeAt: tx.at });
    const entered = presentPart(await loadPart(tx, heldCase, id));
    await recordAct(tx, context.person, { act: 'part.entered', inCase: heldCase, objectId: id, after: entered });
    return entered;
  });
}
