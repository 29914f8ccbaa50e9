import type { ConstantTyped, ConstantView } from '#shared/contracts/materials.ts';
import { readConstant } from '#shared/rules/read-constant.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import { formatConstant } from '#shared/wording/constant.ts';
import { dayOf } from '#shared/wording/dates.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { markDependentsStale } from '../../../lineage/lineage.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { insertConstant } from '../queries/constants.ts';
import { lockMaterial } from '../queries/materials.ts';
import { listConstantsInForce, loadConstant } from './list-constants.ts';

/**
 * Records a constant. It takes the place of the one of its kind in force, and all that rests on that one turns stale, in
 * closed cases too. @throws Problem stale-version where another record came into force meanwhile; not-valid with the field.
 */
export async function recordConstant(context: Context, materialId: string, typed: ConstantTyped) {
  const read = readConstant(typed);
  if (read.kind === 'refused') throw new Problem('not-valid', read.reason, { field: read.field });
  return context.inTransaction(async (tx) => {
    const material = await lockMaterial(tx, materialId);
    if (!material) throw nothingHere();
    const inForce = (await listConstantsInForce(tx, materialId)).find(({ kind }) => kind === typed.kind) ?? null;
    requireWhatWasSeen(typed, inForce);
    requireDay(typed, inForce, dayOf(tx.at));
    const { kind, source, sourceStanding, condition, validFrom, reason } = typed;
    const { kind: _read, ...values } = read;
    const { id } = await insertConstant(tx, {
      ...{ materialId, kind, source, sourceStanding, condition, validFrom, reason, ...values },
      recordNumber: (inForce?.recordNumber ?? 0) + 1,
      supersedesId: inForce?.id ?? null,
      madeBy: context.person.id,
      madeAt: tx.at,
    });
    const made = await loadConstant(tx, id);
    const staleCount = inForce ? await turnStale(tx, { material: material.name, inForce, made }) : 0;
    await recordAct(tx, context.person, {
      act: inForce ? 'constant.replaced' : 'constant.recorded',
      objectId: id,
      before: inForce && { id: inForce.id, value: formatConstant(inForce) },
      after: { materialId, kind, value: formatConstant(made), source, validFrom, staleCount },
      reason,
    });
    return { constant: made, staleCount };
  });
}

async function turnStale(
  tx: Transaction,
  { material, inForce, made }: { material: string; inForce: ConstantView; made: ConstantView },
): Promise<number> {
  const why = `${constantKindTable[made.kind].word} of ${material} is now ${formatConstant(made)}, was ${formatConstant(inForce)}`;
  const cause = { kind: 'material constant', oldId: inForce.id, newId: made.id, why } as const;
  return (await markDependentsStale(tx, cause)).length;
}

function requireWhatWasSeen({ replaces, reason }: ConstantTyped, inForce: ConstantView | null): void {
  if (replaces !== (inForce?.id ?? null))
    throw new Problem('stale-version', 'Another record of this constant came into force while you wrote.', {
      stillHolds: 'Nothing of yours is lost: both stand here side by side.',
      current: inForce,
    });
  if (inForce && !reason?.trim())
    throw new Problem('not-valid', 'Say why another record takes the place of the one in force.', { field: 'reason' });
}

function requireDay({ validFrom }: ConstantTyped, inForce: ConstantView | null, today: string): void {
  if (validFrom > today)
    throw new Problem('not-valid', 'A record holds from today or an earlier day.', { field: 'validFrom' });
  if (inForce && validFrom < inForce.validFrom)
    throw new Problem(
      'not-valid',
      `The record it replaces holds from ${inForce.validFrom}; this one holds no earlier.`,
      {
        field: 'validFrom',
      },
    );
}
