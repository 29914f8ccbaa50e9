import { createHash, randomBytes } from 'node:crypto';
import { Readable } from 'node:stream';
import { fractographs, keptFiles } from '#server/database/tables/fractographs.ts';
import { writeFindings } from '#server/features/findings/service/write-findings.ts';
import { openCase } from '#server/rights/open-case.ts';
import { CaseNumber } from '#shared/contracts/ids.ts';
import { aLoadEstimate, aMaterial, aConstant, markFace } from './a-bar-case.ts';
import { openedCase } from './cases-at-hand.ts';
import type { Admitted, aLaboratory } from './test-server.ts';

type People = Awaited<ReturnType<typeof aLaboratory>>;

export type DraftedCase = {
  number: string;
  id: string;
  /** Of the route: /cases/HB-2026-0001 */
  at: string;
  imageId: string;
  sha256: string;
  marks: { origin: string; mirror: string; flaw: string };
};

async function must(answered: Promise<{ status: number; body: unknown }>): Promise<void> {
  const { status, body } = await answered;
  if (status >= 300) throw new Error(`refused: ${status} ${JSON.stringify(body)}`);
}

/** An image of the case whose bytes are really kept, written as rows, bound to a calibration at the route. */
async function anImageKept(person: Admitted, { id: caseId, at }: { id: string; at: string }) {
  const bytes = randomBytes(64);
  const { sha256 } = await person.context.storage.keepOriginal(Readable.from([bytes]));
  if (sha256 !== createHash('sha256').update(bytes).digest('hex')) throw new Error('kept under another hash');
  const imageId = await person.context.inTransaction(async (tx) => {
    await tx.db.insert(keptFiles).values({ sha256, bytes: bytes.length, keptAt: tx.at });
    const file = { caseId, figureNumber: 1, sha256, fileName: 'face.tif', bytes: bytes.length };
    const ready = { state: 'ready', progress: 1, widthPx: 3000, heightPx: 2000 } as const;
    const [row] = await tx.db
      .insert(fractographs)
      .values({ ...file, ...ready, broughtInBy: person.person.id, broughtInAt: tx.at })
      .returning({ id: fractographs.id });
    return row.id;
  });
  const source = 'stage micrometer SM-2';
  const reading = { way: 'typed', pixelSizeXUm: 0.55, relativeUncertainty: 0.0025, source, typed: '0.55 µm' };
  await must(person.client.post(`${at}/fractographs/${imageId}/calibrations`, { reading, bindingSeen: null }));
  return { imageId, sha256 };
}

/**
 * A case in drafting with nothing in the way of its review: asked, pieced, pictured, marked, reckoned on two lines and
 * written up by the analyst.
 */
export async function aDraftedCase(people: People): Promise<DraftedCase> {
  const { analyst } = people;
  const { number, id } = await openedCase(people);
  const at = `/cases/${number}`;
  for (const to of ['examining', 'drafting'])
    await must(analyst.client.post(`${at}/moves`, { to, versionSeen: (await analyst.client.get(at)).body.version }));
  const nothing = { serial: null, drawing: null, maker: null, materialId: null, environment: null };
  const part = { ...nothing, description: 'Post insulator', temperatureC: null, serviceTime: null };
  await must(analyst.client.post(`${at}/evidence/parts`, part));
  const { imageId, sha256 } = await anImageKept(analyst, { id, at });
  const marks = await markFace(analyst, { number, imageId }, { radiusPx: 1018, flawPx: 116.4 });
  await must(analyst.client.post(`${at}/estimates`, aLoadEstimate()));
  const mirror = {
    materialId: await aMaterial(people),
    kind: 'mirror constant, outer',
    value: 8.5,
    expanded: 0.6,
  } as const;
  await must(
    analyst.client.post(`${at}/estimates`, {
      method: 'mirror.stress',
      inputs: {
        A: { from: 'constant', constantId: await aConstant(people, mirror) },
        R: { from: 'mark', markId: marks.mirror, quantity: 'mirror radius', relativeUncertaintyPercent: 6 },
      },
    }),
  );
  await writeUp(analyst, number);
  return { number, id, at, imageId, sha256, marks };
}

const text = (words: string) => [{ type: 'text', text: words }];

async function writeUp({ context }: Admitted, number: string): Promise<void> {
  const heldCase = await openCase(context, CaseNumber.parse(number), 'write findings');
  await writeFindings(context, heldCase, [
    { type: 'heading', attrs: { level: 2 }, content: text('What the surface shows') },
    { type: 'paragraph', content: text('The break began at machining damage on the tensile edge.') },
  ]);
}
