import type { EstimatesView, EstimateStaleView, EstimateView } from '#shared/contracts/estimates.ts';
import type { Reader } from '../../../database/connection.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { presentAgreement } from '../present/agreement.ts';
import { presentEstimate } from '../present/estimate.ts';
import { presentStress } from '../present/stress.ts';
import { listEstimateRows, type EstimateRow, type HeldCase } from '../queries/estimates.ts';
import { listConstantSources, listInputRows, listReadingSources } from '../queries/inputs.ts';
import { listStaleness, type StalenessRow } from '../queries/staleness.ts';
import { comparedAsKept, comparedAsWouldBe, comparedRows, judge } from './judge-lines.ts';
import { reckonWouldBe, type WouldBe } from './would-be.ts';

/** Every estimate of a case, in force and superseded, and the verdict over the lines in force. */
export async function listEstimates(reader: Reader, heldCase: HeldCase): Promise<EstimatesView> {
  const rows = await listEstimateRows(reader, heldCase);
  const about = await gather(reader, heldCase, rows);
  const compared = comparedRows(rows);
  const kept = (row: EstimateRow) => comparedAsKept(row, about.inputsOf(row.id), about.found.readings);
  const agreement = judge(compared.map(kept));
  const then = judge(
    compared.flatMap((row) => {
      const wouldBe = about.wouldBe.get(row.id);
      return wouldBe ? (comparedAsWouldBe(wouldBe) ?? []) : [kept(row)];
    }),
  );
  const estimates = rows.map((row) => {
    const staleness = about.stalenessOf(row.id);
    return presentEstimate({
      caseNumber: heldCase.number,
      row,
      inputs: about.inputsOf(row.id),
      found: about.found,
      staleness,
      isCompared: compared.includes(row),
      stale: presentStale(staleness, about.wouldBe.get(row.id), agreement.verdict, then.verdict),
    });
  });
  return { estimates, agreement: presentAgreement(agreement) };
}

/** One estimate of the case with all that stands beside it. @throws Problem not-found */
export async function loadEstimateView(reader: Reader, heldCase: HeldCase, id: string): Promise<EstimateView> {
  const { estimates } = await listEstimates(reader, heldCase);
  const view = estimates.find((estimate) => estimate.id === id);
  if (!view) throw nothingHere();
  return view;
}

/** Estimates neither superseded nor set aside, by their numbers; stale ones among them. */
export async function listEstimatesInForce(reader: Reader, heldCase: HeldCase): Promise<EstimateView[]> {
  const { estimates } = await listEstimates(reader, heldCase);
  return estimates.filter((each) => each.supersededById === null && each.standing.standing === 'in use');
}

async function gather(reader: Reader, heldCase: HeldCase, rows: readonly EstimateRow[]) {
  const ids = rows.map((row) => row.id);
  const inputs = await listInputRows(reader, ids);
  const staleness = await listStaleness(reader, ids);
  const sourceIds = inputs.flatMap((input) => input.sourceId ?? []);
  const readings = await listReadingSources(reader, sourceIds);
  const constants = await listConstantSources(reader, sourceIds);
  const inputsOf = (id: string) => inputs.filter((input) => input.estimateId === id);
  const stalenessOf = (id: string) => staleness.filter((each) => each.recordId === id);
  const wouldBe = new Map<string, WouldBe>();
  for (const row of rows.filter((each) => each.supersededById === null)) {
    if (stalenessOf(row.id).every((each) => each.settledAt !== null)) continue;
    wouldBe.set(row.id, await reckonWouldBe(reader, heldCase, row, inputsOf(row.id)));
  }
  const found = {
    readings: new Map(readings.map((each) => [each.id, each])),
    constants: new Map(constants.map((each) => [each.id, each])),
  };
  return { inputsOf, stalenessOf, found, wouldBe };
}

function presentStale(
  staleness: readonly StalenessRow[],
  wouldBe: WouldBe | undefined,
  verdictNow: EstimateStaleView['verdictNow'],
  verdictThen: EstimateStaleView['verdictNow'],
): EstimateStaleView | null {
  const open = staleness.filter((each) => each.settledAt === null);
  const [first] = open;
  if (!first || !wouldBe) return null;
  const { reckoned, changes, hindrance } = wouldBe;
  return {
    since: first.since.toISOString(),
    causes: open.map(({ causeKind, causeId, replacedById, why, since }) => ({
      kind: causeKind,
      id: causeId,
      replacedById,
      why,
      since: since.toISOString(),
    })),
    changes: [...changes],
    wouldBe: reckoned ? presentStress(reckoned.origin.value, reckoned.origin.standardUncertainty) : null,
    hindrance,
    verdictNow,
    verdictThen: reckoned ? verdictThen : null,
  };
}
