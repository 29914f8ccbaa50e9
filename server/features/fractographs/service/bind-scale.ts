import type { FractographView, ScaleBinding, ScaleReading, ScaleView } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { markDependentsStale, recordLineage } from '../../../lineage/lineage.ts';
import { settleStaleness } from '../../../lineage/settle-staleness.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { holdCalibrationInForce, keepImageCalibration } from '../../laboratory/service/record-calibration.ts';
import { insertBinding } from '../queries/bindings.ts';
import { askAboutDoubts } from './ask-about-doubts.ts';
import { loadFractograph } from './find-fractographs.ts';
import { readScale } from './read-scale.ts';

type Calibrating = HeldFor<'calibrate'>;

/** The calibration an image is about to be bound to. */
type Chosen = {
  readonly id: string;
  readonly name: string;
  readonly pixelSizeXUm: number;
  readonly pixelSizeYUm: number;
};

/**
 * Gives an image its scale: reads or takes a calibration and binds the image to it, in one act. Bound before, the older
 * binding is superseded and all that was read with it turns stale. Ways that disagree are asked about first.
 * @throws Problem not-ready (field `confirm`) with the doubts, not-valid without a reason where one is owed,
 * stale-version where someone bound the image meanwhile
 */
export async function bindScale(
  context: Context,
  heldCase: Calibrating,
  id: FractographId,
  asked: ScaleBinding,
): Promise<FractographView> {
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'calibrate');
    const image = await loadFractograph(tx, heldCase, id);
    requireBindable(image, asked);
    const chosen = await chooseCalibration(tx, context, heldCase, image, asked);
    const binding = await insertBinding(tx, {
      caseId: heldCase.id,
      fractographId: id,
      calibrationId: chosen.id,
      supersedesId: image.scale?.bindingId ?? null,
      reason: asked.reason || null,
      boundBy: context.person.id,
      boundAt: tx.at,
    });
    await recordLineage(tx, { kind: 'calibration binding', id: binding.id }, [
      { kind: 'fractograph', id },
      { kind: 'calibration', id: chosen.id },
    ]);
    const staleRecords = image.scale ? await supersede(tx, context, image, image.scale, chosen, binding.id) : 0;
    await recordAct(tx, context.person, {
      act: 'calibration.bound',
      inCase: heldCase,
      objectId: id,
      before: image.scale && { bindingId: image.scale.bindingId, pixelSizeXUm: image.scale.pixelSizeXUm },
      after: { bindingId: binding.id, calibrationId: chosen.id, ...sizes(chosen), staleRecords },
      reason: asked.reason || null,
    });
    return loadFractograph(tx, heldCase, id);
  });
}

function requireBindable(image: FractographView, asked: ScaleBinding): void {
  if (image.state !== 'ready')
    throw new Problem('not-ready', `Fig. ${image.figureNumber} has no scale until its image is ready.`);
  if ((image.scale?.bindingId ?? null) !== asked.bindingSeen)
    throw new Problem('stale-version', `Fig. ${image.figureNumber} was given another scale meanwhile.`, {
      current: image,
      stillHolds: 'Your readings are still on this page.',
    });
  if (image.scale && !asked.reason)
    throw new Problem('not-valid', 'Say why the scale changes; it stands beside every value that turns stale.', {
      field: 'reason',
    });
}

async function chooseCalibration(
  tx: Transaction,
  context: Context,
  heldCase: Calibrating,
  image: FractographView,
  asked: ScaleBinding,
): Promise<Chosen> {
  const { reading } = asked;
  if (reading.way === 'kept calibration') return takeKept(tx, image, asked, reading);
  const { spreadDoubt, ...read } = readScale(reading, image, context.person.name);
  const name = nameOfWay[read.way];
  await askAboutDoubts(tx, image, { name, way: read.way, pixelSizeUm: read.pixelSizeXUm, spreadDoubt }, asked);
  const row = await keepImageCalibration(tx, {
    ...read,
    caseId: heldCase.id,
    instrumentId: image.instrument?.id ?? null,
    setting: image.objective,
    validFrom: tx.at.toISOString().slice(0, 10),
    reason: asked.reason || null,
    madeBy: context.person.id,
    madeAt: tx.at,
  });
  await recordAct(tx, context.person, {
    act: 'calibration.read',
    inCase: heldCase,
    objectId: row.id,
    after: { fractographId: image.id, way: read.way, ...sizes(read), source: read.source },
  });
  return { ...row, name };
}

const nameOfWay = {
  'burned bar': 'the bar on the image',
  'file tags': 'the file’s own tag',
  typed: 'the typed size',
  graticule: 'the graticule',
} as const;

async function takeKept(
  tx: Transaction,
  image: FractographView,
  asked: ScaleBinding,
  reading: Extract<ScaleReading, { way: 'kept calibration' }>,
): Promise<Chosen> {
  const { calibration } = await holdCalibrationInForce(tx, reading.calibrationId);
  const name = calibration.code ?? 'the kept calibration';
  const chosen = { name, way: 'kept' as const, pixelSizeUm: calibration.pixelSizeXUm, spreadDoubt: null };
  await askAboutDoubts(tx, image, chosen, asked);
  return { ...calibration, name };
}

async function supersede(
  tx: Transaction,
  context: Context,
  image: FractographView,
  old: ScaleView,
  chosen: Chosen,
  bindingId: string,
): Promise<number> {
  const stale = await markDependentsStale(tx, {
    kind: 'calibration binding',
    oldId: old.bindingId,
    newId: bindingId,
    why: `Fig. ${image.figureNumber} was bound to ${chosen.name} (${sized(chosen.pixelSizeXUm)}) in place of ${old.code ?? old.source} (${sized(old.pixelSizeXUm)}) by ${context.person.name}`,
  });
  await settleStaleness(tx, old.bindingId, { by: context.person.id, settlement: 'taken', reason: null });
  return stale.length;
}

function sizes({ pixelSizeXUm, pixelSizeYUm }: { pixelSizeXUm: number; pixelSizeYUm: number }) {
  return { pixelSizeXUm, pixelSizeYUm };
}

function sized(pixelSizeUm: number): string {
  return `${Number(pixelSizeUm.toPrecision(4))} µm/px`;
}
