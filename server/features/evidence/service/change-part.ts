import type { PartChange, PartView } from '#shared/contracts/evidence.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Context } from '../../../http/context.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { presentPart } from '../present.ts';
import { updatePart } from '../queries.ts';
import { loadPart, requireMaterial, requireVersion } from './must-be-there.ts';

/** Changes what is known of a part. @throws Problem stale-version with the part as it stands now */
export function changePart(
  context: Context,
  heldCase: HeldFor<'change evidence'>,
  partId: string,
  change: PartChange,
): Promise<PartView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'change evidence');
    const before = presentPart(await loadPart(tx, heldCase, partId));
    requireVersion(change.version, before, before);
    await requireMaterial(tx, change.materialId);
    await updatePart(tx, partId, { ...change, version: before.version + 1 });
    const after = presentPart(await loadPart(tx, heldCase, partId));
    await recordAct(tx, context.person, { act: 'part.changed', inCase: heldCase, objectId: partId, before, after });
    return after;
  });
}
