import type { CropQuery } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import type { CaseAct } from '#shared/rules/may.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { previewWidthsPx } from '../../../imaging/cut-pyramid.ts';
import { ImageFacts } from '../../../imaging/image-facts.ts';
import { crop, longestPassS } from '../../../imaging/image-pool.ts';
import { nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { findBareFractograph } from '../queries/fractographs.ts';

/** A picture made from an original, not yet read: its tag names it for a browser that holds it already. */
export type Picture = { readonly tag: string; readonly type: string; read(): Promise<Uint8Array> };

type OfCase = { readonly context: Context; readonly heldCase: HeldFor<CaseAct>; readonly id: FractographId };

/** One tile. @throws Problem not-found for one that the image has not */
export async function findTile(of: OfCase, level: number, place: string): Promise<Picture> {
  const { sha256 } = await loadReady(of);
  return derived(of.context, sha256, `tiles/${level}/${place}.jpeg`);
}

/** The whole image, small: the kept width next above the one asked for. */
export async function findPreview(of: OfCase, width: number): Promise<Picture> {
  const { sha256 } = await loadReady(of);
  const kept = previewWidthsPx.find((each) => each >= width) ?? previewWidthsPx[previewWidthsPx.length - 1];
  return derived(of.context, sha256, `preview/${kept}.jpeg`);
}

/** A small picture around a point, made once and then kept beside the tiles. */
export async function findCrop(of: OfCase, asked: CropQuery): Promise<Picture> {
  const { sha256 } = await loadReady(of);
  const { storage, limits } = of.context;
  const [x, y, acrossPx] = [asked.x, asked.y, asked.across ?? asked.width].map(Math.round);
  const name = `crop/${[x, y, acrossPx, asked.width, asked.height].join('_')}.webp`;
  const read = async () => {
    const kept = await storage.readDerived(sha256, name);
    if (kept) return kept;
    const file = await storage.originalFile(sha256);
    const facts = ImageFacts.parse(
      JSON.parse(Buffer.from(await must(of.context, sha256, 'facts/image.json')).toString()),
    );
    const order = { file, facts, limits: { ...limits, longestPassS }, x, y, acrossPx };
    const made = await crop({ ...order, width: asked.width, height: asked.height });
    await storage.keepDerived(sha256, name, made);
    return made;
  };
  return { tag: `${sha256}-${name}`, type: 'image/webp', read };
}

/** The original, bit for bit. @throws Problem not-found once the bytes of a refused file are gone */
export async function findOriginal(of: OfCase) {
  const row = await findBareFractograph(of.context.reader, of.heldCase, of.id);
  if (!row) throw nothingHere();
  const stream = await of.context.storage.readOriginal(row.sha256).catch(() => {
    throw new Problem('not-found', `The bytes of ${row.fileName} are gone; it was refused: ${row.refusedReason ?? ''}`);
  });
  return { stream, fileName: row.fileName, bytes: row.bytes, sha256: row.sha256 };
}

async function loadReady({ context, heldCase, id }: OfCase) {
  const row = await findBareFractograph(context.reader, heldCase, id);
  if (!row) throw nothingHere();
  if (row.state === 'refused') throw new Problem('not-ready', row.refusedReason ?? 'This file was refused.');
  if (row.state !== 'ready')
    throw new Problem('not-ready', `The tiles of Fig. ${row.figureNumber} are still being cut.`);
  return row;
}

function derived(context: Context, sha256: string, name: string): Picture {
  return { tag: `${sha256}-${name}`, type: 'image/jpeg', read: () => must(context, sha256, name) };
}

async function must(context: Context, sha256: string, name: string): Promise<Uint8Array> {
  const bytes = await context.storage.readDerived(sha256, name);
  if (!bytes) throw nothingHere();
  return bytes;
}
