import { boundQuantities, ValueFormat, type BoundValueView } from '#shared/contracts/findings.ts';
import type { EstimateView } from '#shared/contracts/estimates.ts';
import { boundParts, boundText } from '#shared/wording/bound-value.ts';
import type { Reader } from '../../../database/connection.ts';
import { listOpenStaleness } from '../../../lineage/settle-staleness.ts';
import { listEstimates } from '../../estimates/service/list-estimates.ts';
import { readCase, type CaseReading } from '../../marks/service/readings.ts';
import {
  findConstantNow,
  listBoundValueRows,
  listConstantRows,
  listKeptReasons,
  listLengthSources,
  type BoundValueRow,
  type ConstantOfCase,
  type HeldCase,
  type LengthSource,
} from '../queries/bound-values.ts';
import { constantSaid, estimateSaid, lengthSaid, type SourceSaid } from './value-sources.ts';

type Sources = {
  readonly caseNumber: string;
  readonly estimates: readonly EstimateView[];
  readonly lengths: readonly LengthSource[];
  readonly readings: readonly CaseReading[];
  readonly constants: readonly ConstantOfCase[];
  /** By the id of the record bound, the record that stands in for it now. */
  readonly constantsNow: ReadonlyMap<string, ConstantOfCase | null>;
};

/**
 * What every bound value of the case reads, from the record it is pinned to; and, where that rests on something since
 * replaced or a newer value was taken elsewhere, why it is stale and what it would read.
 */
export async function resolveValues(reader: Reader, heldCase: HeldCase): Promise<BoundValueView[]> {
  const rows = await listBoundValueRows(reader, heldCase);
  const ids = rows.map((row) => row.id);
  const stale = await listOpenStaleness(reader, ids);
  const kept = await listKeptReasons(reader, ids);
  const sources = await gatherSources(reader, heldCase, rows);
  const newest = (row: BoundValueRow): BoundValueRow => {
    const next = rows.find((each) => each.id === row.supersededById);
    return next ? newest(next) : row;
  };
  return rows.flatMap((row): BoundValueView[] => {
    const said = saidBy(row, sources);
    if (!said) return [];
    const parts = boundParts(said.value, formatOf(row));
    const open = stale.find((each) => each.recordId === row.id);
    const would = () => textOf(saidNow(newest(row), sources), row);
    const taken = newest(row);
    const why = row.supersededById ? 'a newer value was taken in its place' : open?.why;
    const since = row.supersededById ? taken.madeAt : open?.since;
    return [
      {
        id: row.id,
        sourceKind: row.sourceKind,
        sourceId: row.sourceId,
        quantity: quantityOf(row),
        words: said.words,
        sourceWords: said.sourceWords,
        href: said.href,
        parts,
        text: boundText(parts),
        stale: why && since ? { why, since: since.toISOString(), would: would() } : null,
        keptBecause: kept.findLast((each) => each.recordId === row.id)?.reason ?? null,
      },
    ];
  });
}

async function gatherSources(reader: Reader, heldCase: HeldCase, rows: readonly BoundValueRow[]): Promise<Sources> {
  const idsOf = (kind: BoundValueRow['sourceKind']) =>
    rows.filter((row) => row.sourceKind === kind).map((row) => row.sourceId);
  const constantIds = [...new Set(idsOf('material constant'))];
  const constantsNow = new Map<string, ConstantOfCase | null>();
  for (const id of constantIds) constantsNow.set(id, await findConstantNow(reader, id));
  const lengthIds = idsOf('measurement');
  return {
    caseNumber: heldCase.number,
    estimates: idsOf('estimate').length > 0 ? (await listEstimates(reader, heldCase)).estimates : [],
    lengths: await listLengthSources(reader, lengthIds),
    readings: lengthIds.length > 0 ? await readCase(reader, heldCase) : [],
    constants: await listConstantRows(reader, constantIds),
    constantsNow,
  };
}

function saidBy(row: BoundValueRow, sources: Sources): SourceSaid | null {
  if (row.sourceKind === 'estimate') {
    const estimate = sources.estimates.find(({ id }) => id === row.sourceId);
    return estimate ? estimateSaid(sources.caseNumber, estimate, quantityOf(row)) : null;
  }
  if (row.sourceKind === 'measurement') {
    const length = sources.lengths.find(({ id }) => id === row.sourceId);
    return length ? lengthSaid(sources.caseNumber, length) : null;
  }
  const constant = sources.constants.find(({ id }) => id === row.sourceId);
  return constant ? constantSaid(constant) : null;
}

/** What the same value reads from what is in force now; null where nothing says it any more. */
function saidNow(row: BoundValueRow, sources: Sources): SourceSaid | null {
  if (row.sourceKind === 'estimate') {
    const estimate = lastOf(sources.estimates, row.sourceId);
    if (!estimate) return null;
    const said = estimateSaid(sources.caseNumber, estimate, quantityOf(row));
    const wouldBe = estimate.stale?.wouldBe;
    // On the tensile face only an estimate made again says what it would be.
    if (!estimate.stale) return said;
    return said && wouldBe && quantityOf(row) === 'stress at the origin' ? { ...said, value: wouldBe } : null;
  }
  if (row.sourceKind === 'measurement') {
    const length = sources.lengths.find(({ id }) => id === row.sourceId);
    const now = sources.readings.find(
      ({ mark, reading }) => mark.id === length?.markId && reading.quantity === length.quantity,
    );
    if (!length || !now || now.reading.valueMm === null || now.reading.standardUncertaintyMm === null) return null;
    const { valueMm, standardUncertaintyMm } = now.reading;
    return lengthSaid(sources.caseNumber, { ...length, valueMm, standardUncertaintyMm });
  }
  const constant = sources.constantsNow.get(row.sourceId);
  return constant ? constantSaid(constant) : null;
}

/** An estimate, or the last of those made in its place. */
export function lastOf(estimates: readonly EstimateView[], id: string): EstimateView | undefined {
  const estimate = estimates.find((each) => each.id === id);
  return estimate?.supersededById ? lastOf(estimates, estimate.supersededById) : estimate;
}

function textOf(said: SourceSaid | null, row: BoundValueRow): string | null {
  return said ? boundText(boundParts(said.value, formatOf(row))) : null;
}

export const formatOf = (row: Pick<BoundValueRow, 'format'>): ValueFormat => ValueFormat.parse(row.format);

export function quantityOf(row: Pick<BoundValueRow, 'quantity'>) {
  const quantity = boundQuantities.find((each) => each === row.quantity);
  if (!quantity) throw new Error(`a bound value says ${row.quantity}, which nothing is called`);
  return quantity;
}
