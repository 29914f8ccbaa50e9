import type { BoundQuantity, BoundValueView, ValueFormat, ValueToBind } from '#shared/contracts/findings.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { ActName } from '../../../audit/act-table.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { recordLineage } from '../../../lineage/lineage.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { loadEstimateView } from '../../estimates/service/list-estimates.ts';
import { readMeasurement } from '../../marks/service/read-measurement.ts';
import { findConstantNow, insertBoundValue } from '../queries/bound-values.ts';
import { resolveValues } from './resolve-values.ts';
import { estimateSaid } from './value-sources.ts';

type Source = Pick<BoundValueView, 'sourceKind' | 'sourceId'> & { readonly quantity: BoundQuantity };

/**
 * Binds a value of this case: the record it is pinned to is in force and not stale when it is bound.
 * @throws Problem not-found for a source of another case; not-ready for a stale one; not-valid for a replaced one
 */
export async function bindValue(
  context: Context,
  heldCase: HeldFor<'write findings'>,
  wanted: ValueToBind,
): Promise<BoundValueView> {
  const id = await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    const source = await findSource(tx, context, heldCase, wanted);
    return keepBinding(tx, context, heldCase, { source, format: wanted.format, act: 'value.bound' });
  });
  return loadValue(context, heldCase, id);
}

export type BindingKept = {
  readonly source: Source;
  readonly format: ValueFormat;
  readonly act: Extract<ActName, `value.${string}`>;
  readonly supersedesId?: string;
};

/** Writes the record of a bound value with what it was made from. */
export async function keepBinding(
  tx: Transaction,
  context: Context,
  heldCase: HeldFor<'write findings'>,
  { source, format, act, supersedesId }: BindingKept,
): Promise<string> {
  const { id } = await insertBoundValue(tx, {
    ...source,
    format,
    supersedesId: supersedesId ?? null,
    caseId: heldCase.id,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  await recordLineage(tx, { kind: 'bound value', id }, [{ kind: source.sourceKind, id: source.sourceId }]);
  await recordAct(tx, context.person, {
    act,
    inCase: heldCase,
    objectId: id,
    before: supersedesId ? { boundValue: supersedesId } : null,
    after: { ...source },
  });
  return id;
}

/** One bound value as it reads now. @throws Problem not-found */
export async function loadValue(
  context: Context,
  heldCase: HeldFor<'write findings'>,
  id: string,
): Promise<BoundValueView> {
  const value = (await resolveValues(context.reader, heldCase)).find((each) => each.id === id);
  if (!value) throw nothingHere();
  return value;
}

async function findSource(
  tx: Transaction,
  context: Context,
  heldCase: HeldFor<'write findings'>,
  wanted: ValueToBind,
): Promise<Source> {
  const { sourceKind, quantity } = wanted;
  if (sourceKind === 'measurement') {
    const { id } = await readMeasurement(tx, context, heldCase, { markId: wanted.markId, quantity: wanted.measured });
    return { sourceKind, sourceId: id, quantity };
  }
  if (sourceKind === 'material constant') {
    const now = await findConstantNow(tx, wanted.sourceId);
    if (!now) throw nothingHere();
    if (now.id !== wanted.sourceId)
      throw new Problem('not-valid', `Record ${now.recordNumber} of ${now.materialName} has taken its place.`, {
        field: 'sourceId',
      });
    return { sourceKind, sourceId: now.id, quantity };
  }
  const estimate = await loadEstimateView(tx, heldCase, wanted.sourceId);
  const named = `Estimate ${estimate.number}`;
  if (estimate.supersededById) throw new Problem('not-valid', `${named} has been made again.`, { field: 'sourceId' });
  if (estimate.stale)
    throw new Problem('not-ready', `${named} is stale: ${estimate.stale.causes[0]?.why ?? ''}. Settle it first.`, {
      field: 'sourceId',
      stillHolds: 'Nothing was bound; the text is as it was.',
    });
  if (!estimateSaid(heldCase.number, estimate, quantity))
    throw new Problem('not-valid', `${named} says no stress on the tensile face.`, { field: 'quantity' });
  return { sourceKind, sourceId: estimate.id, quantity };
}
