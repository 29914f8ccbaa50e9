import type { FigureToPlace, FigureView } from '#shared/contracts/findings.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { ActName } from '../../../audit/act-table.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { recordLineage } from '../../../lineage/lineage.ts';
import { settleStaleness } from '../../../lineage/settle-staleness.ts';
import { lockCase, nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { loadFractograph } from '../../fractographs/service/find-fractographs.ts';
import { listCaseMarks } from '../../marks/service/list-marks.ts';
import { insertFigure, listFigureMarks, listFigureRows } from '../queries/figures.ts';
import { listFigures } from './list-figures.ts';

type Held = HeldFor<'write findings'>;

/** Draws a figure of a fractograph of this case with the chosen marks as they stand now. */
export async function placeFigure(context: Context, heldCase: Held, wanted: FigureToPlace): Promise<FigureView> {
  const id = await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    return keepFigure(tx, context, heldCase, { ...wanted, act: 'figure.placed' });
  });
  return loadFigure(context, heldCase, id);
}

/** Draws a figure again, with its marks and scale as they stand now; marks taken off since are left out. */
export async function drawAgain(context: Context, heldCase: Held, id: string): Promise<FigureView> {
  const newId = await context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'write findings');
    const rows = await listFigureRows(tx, heldCase);
    const row = rows.find((each) => each.id === id);
    if (!row) throw nothingHere();
    if (row.supersededById) return row.supersededById;
    const drawn = (await listFigureMarks(tx, heldCase)).filter((mark) => mark.figureId === id);
    const standing = await listCaseMarks({ ...context, reader: tx }, heldCase);
    const markIds = drawn.map((mark) => mark.id).filter((markId) => standing.some((mark) => mark.id === markId));
    const { fractographId, caption, framePx, scaleBar } = row;
    const again = { fractographId, caption, framePx, scaleBar, markIds, supersedesId: id } as const;
    const made = await keepFigure(tx, context, heldCase, { ...again, act: 'figure.renewed' });
    await settleStaleness(tx, id, { by: context.person.id, settlement: 'taken', reason: null });
    return made;
  });
  return loadFigure(context, heldCase, newId);
}

type FigureKept = Omit<FigureToPlace, 'fractographId'> & {
  readonly fractographId: string;
  readonly act: Extract<ActName, `figure.${string}`>;
  readonly supersedesId?: string;
};

async function keepFigure(tx: Transaction, context: Context, heldCase: Held, kept: FigureKept): Promise<string> {
  const { act, supersedesId, markIds, ...figure } = kept;
  const fractograph = await loadFractograph(tx, heldCase, figure.fractographId as FigureToPlace['fractographId']); // brand: read from the table, or from the contract
  if (fractograph.state !== 'ready')
    throw new Problem('not-ready', `Fig. ${fractograph.figureNumber} is not ready yet.`, { field: 'fractographId' });
  const standing = await listCaseMarks({ ...context, reader: tx }, heldCase);
  const marks = markIds.map((markId) => {
    const mark = standing.find((each) => each.id === markId && each.fractographId === fractograph.id);
    if (!mark) throw new Problem('not-valid', 'A chosen mark does not stand on this figure.', { field: 'markIds' });
    return mark;
  });
  const { id } = await insertFigure(tx, {
    ...figure,
    markIds,
    supersedesId: supersedesId ?? null,
    caseId: heldCase.id,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  await recordLineage(tx, { kind: 'figure', id }, [
    { kind: 'fractograph', id: fractograph.id },
    ...marks.map((mark) => ({ kind: 'mark version' as const, id: mark.versionId })),
    ...(fractograph.scale ? [{ kind: 'calibration binding' as const, id: fractograph.scale.bindingId }] : []),
  ]);
  await recordAct(tx, context.person, {
    act,
    inCase: heldCase,
    objectId: id,
    before: supersedesId ? { figure: supersedesId } : null,
    after: { figure: `Fig. ${fractograph.figureNumber}`, marks: marks.map((mark) => `m${mark.number}`) },
  });
  return id;
}

async function loadFigure(context: Context, heldCase: Held, id: string): Promise<FigureView> {
  const figure = (await listFigures(context.reader, heldCase)).find((each) => each.id === id);
  if (!figure) throw nothingHere();
  return figure;
}
