import { randomUUID } from 'node:crypto';
import { openNewCase } from '#server/features/cases/service/open-a-case.ts';
import { calibrationBindings, fractographs, keptFiles } from '#server/database/tables/fractographs.ts';
import { bindScale } from '#server/features/fractographs/service/bind-scale.ts';
import {
  enterInstrument,
  recordCalibration,
  replaceCalibration,
} from '#server/features/laboratory/service/record-calibration.ts';
import { enterMaterial } from '#server/features/materials/service/keep-material.ts';
import { recordConstant } from '#server/features/materials/service/record-constant.ts';
import { openCase } from '#server/rights/open-case.ts';
import type { Transaction } from '#server/database/connection.ts';
import { recordLineage } from '#server/lineage/lineage.ts';
import { CaseNumber, FractographId } from '#shared/contracts/ids.ts';
import type { EstimateWantedInput } from '#shared/contracts/estimates.ts';
import type { ConstantKind } from '#shared/vocabulary/constant-kinds.ts';
import type { Admitted, aLaboratory } from './test-server.ts';

type People = Awaited<ReturnType<typeof aLaboratory>>;

/** Writes in one transaction as a person would. */
function within<Done>(person: Admitted, work: (tx: Transaction) => Promise<Done>): Promise<Done> {
  return person.context.inTransaction(work);
}

/** A case of the maker about one broken bar. */
export async function aCase(people: People): Promise<{ id: string; number: CaseNumber }> {
  const { id, number } = await openNewCase(people.analyst.context, {
    title: 'Bar A-17: broke in test',
    summary: '',
    kind: 'test specimen',
    urgency: 'routine',
    organisationId: people.maker.id,
    materialId: null,
    questions: [],
  });
  return { id, number: CaseNumber.parse(number) };
}

/** A kept calibration of so many µm a pixel, ± 0.5 % at k = 2; one that takes the place of another makes that stale. */
export async function aCalibration(people: People, pixelSizeUm: number, replacedId: string | null = null) {
  const { context } = people.analyst;
  const entered = {
    setting: '20×',
    way: 'graticule',
    pixelSizeXUm: pixelSizeUm,
    expandedUncertaintyPercent: 0.5,
    source: 'stage micrometer SM-2',
    asFoundErrorPercent: null,
    validFrom: '2026-02-11',
  } as const;
  if (replacedId !== null) {
    const reason = 'The reference scale was found out.';
    return (await replaceCalibration(context, replacedId, { ...entered, reason })).calibration.id;
  }
  const instrument = await enterInstrument(context, { name: `Microscope ${randomUUID()}`, kind: 'compound' });
  return (await recordCalibration(context, { ...entered, instrumentId: instrument.id })).id;
}

export type Image = { id: string; bindingId: string; calibrationId: string };

/** A fractograph of the case, 3000 × 2000 px, bound to a calibration. */
export function aFractograph(
  people: People,
  caseId: string,
  figureNumber: number,
  calibrationId: string,
): Promise<Image> {
  return within(people.analyst, async (tx) => {
    const sha256 = randomUUID().replaceAll('-', '').repeat(2);
    await tx.db.insert(keptFiles).values({ sha256, bytes: 1, keptAt: tx.at });
    const [{ id }] = await tx.db
      .insert(fractographs)
      .values({
        caseId,
        figureNumber,
        sha256,
        fileName: 'face.tif',
        bytes: 1,
        state: 'ready',
        widthPx: 3000,
        heightPx: 2000,
        broughtInBy: people.analyst.person.id,
        broughtInAt: tx.at,
      })
      .returning({ id: fractographs.id });
    const bindingId = await insertBinding(tx, people, { caseId, fractographId: id, calibrationId });
    return { id, bindingId, calibrationId };
  });
}

/** Binds the image to another kept calibration. */
export async function rebind(people: People, number: CaseNumber, image: Image, calibrationId: string): Promise<void> {
  const { context } = people.analyst;
  const heldCase = await openCase(context, number, 'calibrate');
  await bindScale(context, heldCase, FractographId.parse(image.id), {
    reading: { way: 'kept calibration', calibrationId },
    bindingSeen: image.bindingId,
    confirmed: true,
    reason: 'The wrong one had been taken.',
  });
}

async function insertBinding(
  tx: Transaction,
  people: People,
  binding: { caseId: string; fractographId: string; calibrationId: string; supersedesId?: string },
): Promise<string> {
  const [{ id }] = await tx.db
    .insert(calibrationBindings)
    .values({ ...binding, boundBy: people.analyst.person.id, boundAt: tx.at })
    .returning({ id: calibrationBindings.id });
  await recordLineage(tx, { kind: 'calibration binding', id }, [
    { kind: 'fractograph', id: binding.fractographId },
    { kind: 'calibration', id: binding.calibrationId },
  ]);
  return id;
}

export async function aMaterial(people: People): Promise<string> {
  const name = `Alumina ${randomUUID()}`;
  const { id } = await enterMaterial(people.engineer.context, {
    name,
    family: 'alumina',
    route: null,
    grainSizeUm: null,
    note: null,
  });
  return id;
}

type ConstantWanted = {
  materialId: string;
  kind: ConstantKind;
  value: number;
  expanded: number;
  supersedesId?: string;
};

/** A constant with U at k = 2; one that takes the place of another makes what hangs on that one stale. */
export async function aConstant(people: People, wanted: ConstantWanted): Promise<string> {
  const { materialId, kind, value, expanded, supersedesId = null } = wanted;
  const { constant } = await recordConstant(people.engineer.context, materialId, {
    kind,
    value: `${value} MPa m½`,
    plusMinus: String(expanded),
    plusMinusIs: 'U',
    source: 'own bars of the lot',
    sourceStanding: 'own test',
    condition: null,
    validFrom: '2026-01-09',
    reason: supersedesId === null ? null : 'A longer series was tested.',
    replaces: supersedesId,
  });
  return constant.id;
}

const upright = { x: 1500, y: 1500 };

/** Draws the origin, a mirror of that radius to its left and right, and a round flaw, all in px. @returns their ids */
export async function markFace(
  person: Admitted,
  at: { number: string; imageId: string },
  face: { radiusPx: number; flawPx: number; boundary?: string },
) {
  const path = `/cases/${at.number}/fractographs/${at.imageId}/marks`;
  const draw = async (mark: Record<string, unknown>): Promise<string> => {
    const said = { certainty: 'certain', boundary: null, originCode: null, note: '' };
    const { status, body } = await person.client.post(path, { ...said, ...mark });
    if (status !== 201) throw new Error(`mark refused: ${JSON.stringify(body)}`);
    return String(body.id);
  };
  const { x, y } = upright;
  const origin = await draw({ kind: 'origin', geometry: { shape: 'point', at: upright }, originCode: 'MD' });
  const mirror = await draw({
    kind: 'mirror',
    boundary: face.boundary ?? 'outer',
    geometry: {
      shape: 'chain',
      points: [
        { x: x - face.radiusPx, y },
        { x: x + face.radiusPx, y },
      ],
    },
  });
  const flaw = await draw({
    kind: 'flaw outline',
    geometry: {
      shape: 'ellipse',
      centre: upright,
      halfAxisDepthPx: face.flawPx,
      halfAxisAlongPx: face.flawPx,
      turnDeg: 0,
      flawShape: 'half-ellipse',
      place: 'surface',
      points: [],
    },
  });
  return { origin, mirror, flaw };
}

const typed = (text: string, uncertaintyText: string) => ({ from: 'typed', text, uncertaintyText }) as const;

/** Bar A-17: 421 N over 40 and 20 mm on 4.01 × 3.00 mm. */
export function aLoadEstimate(change: Partial<EstimateWantedInput['inputs']> = {}): EstimateWantedInput {
  const inputs: EstimateWantedInput['inputs'] = {
    load: typed('421 N', '1.73 %'),
    outerSpan: typed('40 mm', '0.1 mm'),
    innerSpan: typed('20 mm', '0.1 mm'),
    width: typed('4.01 mm', '0.01'),
    depth: typed('3.00 mm', '0.01'),
  };
  for (const [name, input] of Object.entries(change)) if (input) inputs[name] = input;
  return { method: 'bend4.rect', inputs };
}
