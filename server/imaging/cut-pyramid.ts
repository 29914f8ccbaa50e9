import { mkdir, readdir, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import sharp from 'sharp';
import { pyramidOf, tileSizePx, type PyramidLevel } from '#shared/numeric/imaging/pyramid.ts';
import { asSeen, openImage, type ImageFacts, type ImageLimits } from './image-facts.ts';
import { refusalOfDamage } from './refusal-of-damage.ts';

// At 88 a grey surface shows no block edges at twice its size; tiles are for looking, lengths come from coordinates.
const tileQuality = 88;
/** Widths of the small pictures of the whole image that are kept beside the tiles, px. */
export const previewWidthsPx = [320, 800, 1600] as const;

export type CutOrder = {
  readonly file: string;
  readonly facts: ImageFacts;
  readonly limits: ImageLimits;
  /** An empty folder to work in; ends up with `tiles/<level>/<column>_<row>.jpeg` and `preview/<width>.jpeg`. */
  readonly folder: string;
};

export type Cut = { readonly kind: 'cut' } | { readonly kind: 'refused'; readonly reason: string };

/**
 * Cuts the tiles of an image, level by level as `pyramidOf` states them: the image is decoded whole, each level is the one
 * above it resized to exactly its size, and no level keeps more than itself in memory. A second run gives the same files.
 */
export async function cutPyramid(order: CutOrder): Promise<Cut> {
  const { levels } = pyramidOf(order.facts);
  try {
    for (const level of levels.toReversed()) await cutLevel(order, level, levels.length - 1);
  } catch (error) {
    return { kind: 'refused', reason: refusalOfDamage(error) };
  }
  await drawPreviews(order, levels);
  for (const level of levels) await rm(levelFile(order, level.level), { force: true });
  return { kind: 'cut' };
}

const levelFile = (order: CutOrder, level: number) => join(order.folder, `level-${level}.tif`);

async function cutLevel(order: CutOrder, level: PyramidLevel, top: number): Promise<void> {
  const image =
    level.level === top ? asSeen(openImage(order.file, order.limits), order.facts) : await resized(order, level, top);
  const made = join(order.folder, `cut-${level.level}`);
  await image
    .jpeg({ quality: tileQuality, chromaSubsampling: '4:4:4' })
    .tile({ size: tileSizePx, overlap: 0, depth: 'one', layout: 'dz', skipBlanks: -1 })
    .toFile(`${made}.dz`);
  await mkdir(join(order.folder, 'tiles'), { recursive: true });
  await rename(join(`${made}_files`, '0'), join(order.folder, 'tiles', String(level.level)));
  await rm(`${made}_files`, { recursive: true });
  await rm(`${made}.dzi`, { force: true });
}

/** Writes the level's whole picture, made from the level above, and opens it for cutting. */
async function resized(order: CutOrder, level: PyramidLevel, top: number) {
  const above = level.level + 1;
  const size = { widthPx: level.widthPx, heightPx: level.heightPx };
  const smaller =
    above === top
      ? asSeen(openImage(order.file, order.limits), order.facts, size)
      : openLevel(order, above).resize(size.widthPx, size.heightPx, { fit: 'fill' }).toColourspace(spaceOf(order));
  await smaller.tiff({ compression: 'none', bigtiff: true }).toFile(levelFile(order, level.level));
  return openLevel(order, level.level);
}

const spaceOf = (order: CutOrder) => (order.facts.grey ? 'b-w' : 'srgb');

function openLevel(order: CutOrder, level: number) {
  return sharp(levelFile(order, level), { sequentialRead: true, limitInputPixels: false }).toColourspace(
    spaceOf(order),
  );
}

async function drawPreviews(order: CutOrder, levels: readonly PyramidLevel[]): Promise<void> {
  await mkdir(join(order.folder, 'preview'));
  const top = levels.length - 1;
  for (const width of previewWidthsPx) {
    const level = levels.find((each) => each.widthPx >= width)?.level ?? top;
    const widthPx = Math.min(width, order.facts.widthPx);
    const size = { widthPx, heightPx: Math.max(1, Math.round((widthPx * order.facts.heightPx) / order.facts.widthPx)) };
    const image =
      level === top
        ? asSeen(openImage(order.file, order.limits), order.facts, size)
        : openLevel(order, level).resize(size.widthPx, size.heightPx, { fit: 'fill' });
    await image
      .jpeg({ quality: tileQuality, chromaSubsampling: '4:4:4' })
      .toFile(join(order.folder, 'preview', `${width}.jpeg`));
  }
}

/** How many tiles stand in the folder of a cut under way. */
export async function countTiles(folder: string): Promise<number> {
  const names = await readdir(folder, { recursive: true });
  return names.filter((name) => /\d+_\d+\.jpeg$/.test(name)).length;
}
