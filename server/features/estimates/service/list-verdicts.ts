import type { CasebookVerdicts } from '#shared/contracts/casebook-verdicts.ts';
import type { CaseNumber } from '#shared/contracts/ids.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { openCase } from '../../../rights/open-case.ts';
import { listEstimateRowsOf, type HeldCase } from '../queries/estimates.ts';
import { listInputRows, listReadingSources } from '../queries/inputs.ts';
import { comparedAsKept, comparedRows, judge } from './judge-lines.ts';

/** The verdict of each case that the person may read and that has a line in force; the others are left out in silence. */
export async function listVerdicts(context: Context, numbers: readonly CaseNumber[]): Promise<CasebookVerdicts> {
  const { reader } = context;
  const opened = await Promise.all(numbers.map((number) => openIfRead(context, number)));
  const rows = await listEstimateRowsOf(
    reader,
    opened.flatMap((heldCase) => heldCase ?? []),
  );
  const compared = opened.map((heldCase) => comparedRows(rows.filter((row) => row.caseId === heldCase?.id)));
  const inputs = await listInputRows(
    reader,
    compared.flatMap((lines) => lines.map(({ id }) => id)),
  );
  const sources = await listReadingSources(
    reader,
    inputs.flatMap(({ sourceId }) => sourceId ?? []),
  );
  const readings = new Map(sources.map((source) => [source.id, source]));
  const inputsOf = (id: string) => inputs.filter((input) => input.estimateId === id);
  return numbers.flatMap((number, index) => {
    const lines = compared[index] ?? [];
    if (lines.length === 0) return [];
    const { verdict } = judge(lines.map((row) => comparedAsKept(row, inputsOf(row.id), readings)));
    return [{ number, verdict }];
  });
}

/** The case, or nothing where it is not there for this person. */
async function openIfRead(context: Context, number: CaseNumber): Promise<HeldCase | null> {
  try {
    return await openCase(context, number, 'read');
  } catch (fault) {
    if (fault instanceof Problem && (fault.code === 'not-found' || fault.code === 'not-allowed')) return null;
    throw fault;
  }
}
