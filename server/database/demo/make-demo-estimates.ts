import type { EstimateView, WantedInput } from '#shared/contracts/estimates.ts';
import type { MarkView } from '#shared/contracts/marks.ts';
import type { ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import { estimateLines, type EstimateLine } from '#shared/vocabulary/estimate-lines.ts';
import { listEstimates } from '../../features/estimates/service/list-estimates.ts';
import { makeEstimate } from '../../features/estimates/service/make-estimate.ts';
import { renewEstimate } from '../../features/estimates/service/renew-estimate.ts';
import { listCaseMarks } from '../../features/marks/service/list-marks.ts';
import { listConstantsInForce } from '../../features/materials/service/list-constants.ts';
import { findFigure } from './bring-in-views.ts';
import type { DemoCase, DemoEstimates, DemoReading } from './demo-case.ts';
import type { Hands } from './hands.ts';

type Wanted = { readonly method: string; readonly inputs: Record<string, WantedInput> };
type Made = { readonly told: DemoCase; readonly round: DemoEstimates; readonly place: number };

/** One round of estimates by who read the figure; a later round stands in for the earlier of the same lines. */
export async function makeDemoEstimates(hands: Hands, { told, round, place }: Made): Promise<void> {
  const reading = round.reading === undefined ? undefined : told.readings[round.reading];
  const by = reading?.by ?? told.holder;
  const marks = reading ? await marksOfFigure(hands, told, reading) : [];
  const constants = await constantsOf(hands, told);
  const wanted: Partial<Record<EstimateLine, Wanted>> = {
    load: round.load && { method: round.load.method, inputs: typedInputs(round.load.inputs) },
    mirror: round.mirror && mirrorWanted(round.mirror, marks, constants),
    flaw: round.flaw && reading && flawWanted(round.flaw, reading, marks, constants),
  };
  for (const line of estimateLines) {
    const asked = wanted[line];
    if (!asked) continue;
    const making = { name: `estimate ${place} ${line}`, by, code: told.code, act: 'estimate' } as const;
    await hands.onceIn(making, async (context, heldCase) => {
      const supersedesId = (await inForce(hands, told)).find((each) => each.line === line)?.id ?? null;
      await makeEstimate(context, heldCase, { ...asked, supersedesId, boundaryNote: '', remark: round.remark ?? '' });
    });
  }
}

/** Makes every stale estimate of a case again, by its analyst. */
export async function renewStale(hands: Hands, told: DemoCase, remark: string): Promise<void> {
  const { code, holder: by } = told;
  for (const line of estimateLines)
    await hands.onceIn({ name: `renew ${line}`, by, code, act: 'estimate' }, async (context, heldCase) => {
      const stale = (await inForce(hands, told)).find((each) => each.line === line && each.stale !== null);
      if (stale) await renewEstimate(context, heldCase, stale.id, { remark });
    });
}

/** The estimates of a case that nothing stands in for. */
export async function inForce(hands: Hands, { code, holder }: DemoCase): Promise<EstimateView[]> {
  const { estimates } = await listEstimates(hands.visitor.reader, await hands.look(code, holder));
  return estimates.filter(({ supersededById }) => supersededById === null);
}

async function marksOfFigure(hands: Hands, told: DemoCase, { figure }: DemoReading): Promise<MarkView[]> {
  const { id } = await findFigure(hands, told, figure);
  const marks = await listCaseMarks(hands.reading(told.holder), await hands.look(told.code, told.holder));
  return marks.filter(({ fractographId }) => fractographId === id);
}

async function constantsOf(hands: Hands, { code, holder }: DemoCase) {
  const { materialId } = await hands.look(code, holder);
  return materialId === null ? [] : listConstantsInForce(hands.visitor.reader, materialId);
}

type Constants = Awaited<ReturnType<typeof constantsOf>>;

function typedInputs(inputs: NonNullable<DemoEstimates['load']>['inputs']): Record<string, WantedInput> {
  return Object.fromEntries(
    Object.entries(inputs).map(([name, { text, standardUncertainty }]) => [name, typed(text, standardUncertainty, '')]),
  );
}

function typed(text: string, uncertaintyText: string, note: string): WantedInput {
  return { from: 'typed', text, uncertaintyText, uncertaintyAs: 'standard', note, boundary: null };
}

function mirrorWanted(
  { radiusPercent }: NonNullable<DemoEstimates['mirror']>,
  marks: readonly MarkView[],
  constants: Constants,
): Wanted {
  const mirror = theOne(marks, 'mirror');
  const constant = constants.find(({ kind }) => kind === `mirror constant, ${mirror.boundary ?? 'not stated'}`);
  return {
    method: 'mirror.stress',
    inputs: {
      A: { from: 'constant', constantId: constant?.id ?? '' },
      R: {
        from: 'mark',
        markId: mirror.id,
        quantity: 'mirror radius',
        relativeUncertaintyPercent: radiusPercent,
      },
    },
  };
}

function flawWanted(
  { shapeFactor, shapeFactorPercent, sizePercent }: NonNullable<DemoEstimates['flaw']>,
  { place, flawShape }: DemoReading,
  marks: readonly MarkView[],
  constants: Constants,
): Wanted {
  const toughness: ConstantKind = 'toughness';
  const note = `practice value, ${flawShape} (${place})`;
  return {
    method: 'flaw.stress',
    inputs: {
      KIc: { from: 'constant', constantId: constants.find(({ kind }) => kind === toughness)?.id ?? '' },
      Y: typed(shapeFactor, `${shapeFactorPercent} %`, note),
      c: {
        from: 'mark',
        markId: theOne(marks, 'flaw outline').id,
        quantity: 'flaw half-axis, depth',
        relativeUncertaintyPercent: sizePercent,
      },
    },
  };
}

function theOne(marks: readonly MarkView[], wanted: MarkView['kind']): MarkView {
  const mark = marks.find(({ kind }) => kind === wanted);
  if (!mark) throw new Error(`no ${wanted} is marked`);
  return mark;
}
