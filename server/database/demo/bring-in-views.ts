import { Readable } from 'node:stream';
import { setTimeout as wait } from 'node:timers/promises';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import { readEvidence } from '../../features/evidence/service/read-evidence.ts';
import { bindScale } from '../../features/fractographs/service/bind-scale.ts';
import { describeFractograph } from '../../features/fractographs/service/describe-fractograph.ts';
import { listFractographs } from '../../features/fractographs/service/find-fractographs.ts';
import { receiveFractograph } from '../../features/fractographs/service/receive-fractograph.ts';
import type { HeldFor } from '../../rights/open-case.ts';
import type { DemoCase } from './demo-case.ts';
import type { DrawnAhead } from './draw-ahead.ts';
import { findCalibration } from './found-laboratory.ts';
import type { Hands } from './hands.ts';
import type { CaseView } from './views.ts';

const lookAgainMs = 150;
const longestCutMs = 5 * 60 * 1000;

type Bringing = { readonly told: DemoCase; readonly views: readonly CaseView[]; readonly pictures: DrawnAhead };

/** Brings in every view of a case, says what it shows and, once its tiles are cut, gives it its scale. */
export async function bringInViews(hands: Hands, { told, views, pictures }: Bringing): Promise<void> {
  for (const view of views) await bringIn(hands, told, view, pictures);
  await untilReady(hands, told);
  for (const view of views) {
    const { boundTo } = told.readings.find(({ figure }) => figure === view.figure) ?? {};
    await describe(hands, told, { ...view, calibration: boundTo ?? view.calibration });
  }
}

function bringIn(hands: Hands, told: DemoCase, view: CaseView, pictures: DrawnAhead): Promise<void> {
  const { code, holder: by } = told;
  const { fileName, caption, face } = view;
  const bringing = { name: `bring in ${fileName}`, by, code, act: 'bring in fractographs' } as const;
  return hands.onceIn(bringing, async (context, heldCase) => {
    const { pieces } = await readEvidence(context, await hands.look(code, by));
    const fragmentId = pieces.find((piece) => piece.code === view.fragment)?.id;
    const kept = await context.storage.keepOriginal(Readable.from([await pictures.take(view)]));
    await receiveFractograph(context, heldCase, { ...kept, fileName }, { caption, fragmentId, face, view: view.view });
  });
}

async function untilReady(hands: Hands, told: DemoCase): Promise<void> {
  for (const end = Date.now() + longestCutMs; Date.now() < end; await wait(lookAgainMs)) {
    const images = await figuresOf(hands, told);
    const refused = images.find(({ state }) => state === 'refused');
    if (refused)
      throw new Error(`Fig. ${refused.figureNumber} of ${told.code} was refused: ${refused.refusedReason ?? ''}`);
    if (images.every(({ state }) => state === 'ready')) return;
  }
  throw new Error(`the tiles of ${told.code} were not cut within ${longestCutMs / 60_000} minutes`);
}

export async function figuresOf(hands: Hands, { code, holder }: DemoCase): Promise<FractographView[]> {
  return listFractographs(hands.visitor.reader, await hands.look(code, holder));
}

/** One figure of a case as it stands. */
export async function findFigure(hands: Hands, told: DemoCase, number: number): Promise<FractographView> {
  const figure = (await figuresOf(hands, told)).find(({ figureNumber }) => figureNumber === number);
  if (!figure) throw new Error(`${told.code} has no Fig. ${number}`);
  return figure;
}

const lightOf: Readonly<Record<string, { illumination?: string; detector?: string; coating?: string }>> = {
  'Stereo microscope': { illumination: 'low-angle, from the upper left' },
  'Electron microscope': { detector: 'secondary electrons', coating: 'gold, about 10 nm' },
  'Macro camera': { illumination: 'low-angle, from the upper left' },
  'Compound microscope': { illumination: 'bright field, aperture stopped down' },
};

async function describe(hands: Hands, told: DemoCase, view: CaseView): Promise<void> {
  const { code, holder: by } = told;
  const { instrument, setting: objective } = await findCalibration(hands, view.calibration);
  const { id, version } = await findFigure(hands, told, view.figure);
  const taken = { takenBy: hands.person(by).name, takenOn: hands.clock.now().toISOString().slice(0, 10) };
  const described = { ...taken, instrumentId: instrument.id, objective, ...lightOf[instrument.name] };
  const describing = { name: `describe ${view.fileName}`, by, code, act: 'bring in fractographs' } as const;
  await hands.onceIn(describing, (context, heldCase) =>
    describeFractograph(context, heldCase, id, { ...described, versionSeen: version }),
  );
  const binding = { name: `bind ${view.fileName}`, by, code, act: 'calibrate' } as const;
  await hands.onceIn(binding, (context, heldCase) => bind({ hands, told, view, context, heldCase }, null));
}

type Binding = {
  readonly hands: Hands;
  readonly told: DemoCase;
  readonly view: CaseView;
  readonly context: Parameters<typeof bindScale>[0];
  readonly heldCase: HeldFor<'calibrate'>;
};

async function bind({ hands, told, view, context, heldCase }: Binding, reason: string | null): Promise<void> {
  const calibration = await findCalibration(hands, view.calibration, true);
  const figure = await findFigure(hands, told, view.figure);
  await bindScale(context, heldCase, figure.id, {
    reading: { way: 'kept calibration', calibrationId: calibration.id },
    bindingSeen: figure.scale?.bindingId ?? null,
    confirmed: false,
    reason: reason ?? '',
  });
}

/** The right scale found later: the objective is put right first, then the image is bound anew. */
export async function bindAnew(hands: Hands, told: DemoCase, view: CaseView, reason: string): Promise<void> {
  const { code, holder: by } = told;
  const { setting: objective } = await findCalibration(hands, view.calibration);
  const { id, version } = await findFigure(hands, told, view.figure);
  const describing = { name: `describe anew ${view.fileName}`, by, code, act: 'bring in fractographs' } as const;
  await hands.onceIn(describing, (context, heldCase) =>
    describeFractograph(context, heldCase, id, { objective, versionSeen: version }),
  );
  const binding = { name: `bind anew ${view.fileName}`, by, code, act: 'calibrate' } as const;
  await hands.onceIn(binding, (context, heldCase) => bind({ hands, told, view, context, heldCase }, reason));
}
