import { setInterval as every } from 'node:timers/promises';
import { Piscina } from 'piscina';
import { pyramidOf } from '#shared/numeric/imaging/pyramid.ts';
import type { CropOrder } from './crop-image.ts';
import { countTiles, type Cut, type CutOrder } from './cut-pyramid.ts';
import type { Examined } from './examine-image.ts';
import type { ImageLimits } from './image-facts.ts';
import type { ImageOrder, ImageWork } from './image-worker.ts';
import type { DrawOrder } from './synthetic-surface/draw-to-file.ts';

// A picture takes seconds; a thread still busy after this is ended with what it holds.
const longestWorkMs = 20 * 60 * 1000;
/** One pass over an image by the decoder, s; well above the largest image on a slow disk. */
export const longestPassS = 600;
const lookEveryMs = 700;

let pool: Piscina | null = null;

/** The threads apart, started when first needed and ended when idle for a while. */
function imagePool(): Piscina {
  if (pool) return pool;
  pool = new Piscina({
    ...workerFile(),
    minThreads: 0,
    maxThreads: 2,
    idleTimeout: 10_000,
    // Of the thread's own objects; pixels are held by the decoder, a strip of the image at a time.
    resourceLimits: { maxOldGenerationSizeMb: 256 },
  });
  // A thread that fell over has failed its own order already; unheard, its error would end the process.
  pool.on('error', () => undefined);
  return pool;
}

function workerFile(): { filename: string; workerData?: { file: string } } {
  if (!import.meta.url.endsWith('.ts')) return { filename: new URL('./image-worker.js', import.meta.url).href };
  return {
    filename: new URL('./worker-from-source.mjs', import.meta.url).href,
    workerData: { file: new URL('./image-worker.ts', import.meta.url).href },
  };
}

async function work<Name extends keyof ImageWork>(
  name: Name,
  asked: ImageWork[Name]['asked'],
): Promise<ImageWork[Name]['gives']> {
  const order = { name, asked } as ImageOrder; // brand: name and order are of one kind by the signature
  return imagePool().run(order, { signal: AbortSignal.timeout(longestWorkMs) });
}

/** Looks into a file, apart from the thread that answers requests. */
export function examine(file: string, limits: ImageLimits): Promise<Examined> {
  return work('examine', { file, limits });
}

/** Cuts all tiles of an image; tells the share done, 0 to 1, about once a second. */
export async function cut(order: CutOrder, onProgress: (share: number) => Promise<void>): Promise<Cut> {
  const total = pyramidOf(order.facts).levels.reduce((sum, level) => sum + level.columns * level.rows, 0);
  const ended = new AbortController();
  const watching = watch(order.folder, total, onProgress, ended.signal);
  try {
    return await work('cut', order);
  } finally {
    ended.abort();
    await watching;
  }
}

async function watch(folder: string, total: number, tell: (share: number) => Promise<void>, signal: AbortSignal) {
  try {
    for await (const _ of every(lookEveryMs, undefined, { signal }))
      await tell(Math.min(1, (await countTiles(folder)) / total));
  } catch (error) {
    // A folder that moves away while it is counted is no failure of the cut; its end is told by the cut itself.
    if (!signal.aborted && !isMissing(error)) throw error;
  }
}

function isMissing(error: unknown): boolean {
  return error instanceof Error && 'code' in error && error.code === 'ENOENT';
}

/** A small picture around a point. */
export function crop(order: CropOrder): Promise<Uint8Array> {
  return work('crop', order);
}

/** A synthetic fracture surface as a file, for the demo. */
export function draw(order: DrawOrder): Promise<Uint8Array> {
  return work('draw', order);
}
