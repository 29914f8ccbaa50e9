import { requireThat } from '../require.ts';

/** Edge of a tile, px; tiles do not overlap. */
export const tileSizePx = 256;

export type RectPx = { readonly x: number; readonly y: number; readonly width: number; readonly height: number };

export type PyramidLevel = {
  /** 0 is the smallest, which fits one tile; the last is the image itself. */
  readonly level: number;
  /** Size of the whole image at this level, px of the level. */
  readonly widthPx: number;
  readonly heightPx: number;
  readonly columns: number;
  readonly rows: number;
};

export type Pyramid = { readonly widthPx: number; readonly heightPx: number; readonly levels: readonly PyramidLevel[] };

export type Tile = {
  readonly level: number;
  readonly column: number;
  readonly row: number;
  /** What to cut, px of the level; the last column and row are narrower. */
  readonly levelRectPx: RectPx;
  /** What it covers, image px, edges not rounded, so that neighbours meet. */
  readonly imageRectPx: RectPx;
};

/**
 * The levels and tiles of an image: each level half the next, rounded up, down to the first that fits one tile. A level is
 * the whole image resized to exactly that size, so one pixel of it covers image width / level width image pixels.
 * @throws OutsideDomain non-positive-dimension, for a size that is not a whole number ≥ 1
 * @example pyramidOf({ widthPx: 1000, heightPx: 600 }).levels.map((level) => level.widthPx) // [250, 500, 1000]
 */
export function pyramidOf(image: { readonly widthPx: number; readonly heightPx: number }): Pyramid {
  const { widthPx, heightPx } = image;
  for (const [field, size] of Object.entries({ widthPx, heightPx })) {
    requireThat(Number.isInteger(size) && size >= 1, 'non-positive-dimension', field);
  }
  const sizes = [{ widthPx, heightPx }];
  let smallest = { widthPx, heightPx };
  while (Math.max(smallest.widthPx, smallest.heightPx) > tileSizePx) {
    smallest = { widthPx: Math.ceil(smallest.widthPx / 2), heightPx: Math.ceil(smallest.heightPx / 2) };
    sizes.unshift(smallest);
  }
  const levels = sizes.map((size, level) => ({
    level,
    ...size,
    columns: Math.ceil(size.widthPx / tileSizePx),
    rows: Math.ceil(size.heightPx / tileSizePx),
  }));
  return { widthPx, heightPx, levels };
}

/** Every tile of one level, row by row; what the cutter writes. */
export function tilesOfLevel(pyramid: Pyramid, level: PyramidLevel): Tile[] {
  return tilesBetween(pyramid, level, { left: 0, top: 0, right: level.columns - 1, bottom: level.rows - 1 });
}

/**
 * The smallest level that is still sharp at this zoom (its pixels at least as many as the screen's; the last level when
 * zoomed past it), and its tiles that touch the seen part of the image. The part may reach beyond the image; a part wholly
 * outside has no tiles.
 */
export function tilesForView(
  pyramid: Pyramid,
  view: { readonly imageRectPx: RectPx; readonly screenPxPerImagePx: number },
): { readonly level: PyramidLevel; readonly tiles: readonly Tile[] } {
  const { imageRectPx: seen, screenPxPerImagePx } = view;
  const level = levelForZoom(pyramid, screenPxPerImagePx);
  const tileWidth = (tileSizePx * pyramid.widthPx) / level.widthPx;
  const tileHeight = (tileSizePx * pyramid.heightPx) / level.heightPx;
  const outside =
    seen.x >= pyramid.widthPx || seen.y >= pyramid.heightPx || seen.x + seen.width <= 0 || seen.y + seen.height <= 0;
  if (outside) return { level, tiles: [] };
  const tiles = tilesBetween(pyramid, level, {
    left: Math.max(0, Math.floor(seen.x / tileWidth)),
    top: Math.max(0, Math.floor(seen.y / tileHeight)),
    right: Math.min(level.columns, Math.ceil((seen.x + seen.width) / tileWidth)) - 1,
    bottom: Math.min(level.rows, Math.ceil((seen.y + seen.height) / tileHeight)) - 1,
  });
  return { level, tiles };
}

function levelForZoom(pyramid: Pyramid, screenPxPerImagePx: number): PyramidLevel {
  // levels round up, so a level at exactly half zoom may be a hair above half; one ppm keeps it from jumping a level
  const enough = screenPxPerImagePx * (1 - 1e-6);
  const level = pyramid.levels.find((each) => each.widthPx / pyramid.widthPx >= enough) ?? pyramid.levels.at(-1);
  if (!level) throw new Error('A pyramid has at least one level');
  return level;
}

type TileRange = { readonly left: number; readonly top: number; readonly right: number; readonly bottom: number };

function tilesBetween(pyramid: Pyramid, level: PyramidLevel, range: TileRange): Tile[] {
  const tiles: Tile[] = [];
  for (let row = range.top; row <= range.bottom; row += 1) {
    for (let column = range.left; column <= range.right; column += 1) tiles.push(tileAt(pyramid, level, column, row));
  }
  return tiles;
}

function tileAt(pyramid: Pyramid, level: PyramidLevel, column: number, row: number): Tile {
  const [x, y] = [column * tileSizePx, row * tileSizePx];
  const width = Math.min(tileSizePx, level.widthPx - x);
  const height = Math.min(tileSizePx, level.heightPx - y);
  const across = pyramid.widthPx / level.widthPx;
  const down = pyramid.heightPx / level.heightPx;
  return {
    level: level.level,
    column,
    row,
    levelRectPx: { x, y, width, height },
    imageRectPx: { x: x * across, y: y * down, width: width * across, height: height * down },
  };
}
