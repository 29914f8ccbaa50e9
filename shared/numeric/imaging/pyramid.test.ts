import { describe, expect, it } from 'vitest';
import { pyramidOf, tilesForView, tilesOfLevel } from './pyramid.ts';

const pyramid = pyramidOf({ widthPx: 1001, heightPx: 600 });
const whole = { x: 0, y: 0, width: 1001, height: 600 };

describe('the pyramid of an image', () => {
  it('halves and rounds up until one tile holds it', () => {
    expect(pyramid.levels).toEqual([
      { level: 0, widthPx: 251, heightPx: 150, columns: 1, rows: 1 },
      { level: 1, widthPx: 501, heightPx: 300, columns: 2, rows: 2 },
      { level: 2, widthPx: 1001, heightPx: 600, columns: 4, rows: 3 },
    ]);
  });

  it('has one level for an image that fits a tile, and nine for one 65 536 px wide', () => {
    expect(pyramidOf({ widthPx: 256, heightPx: 1 }).levels).toHaveLength(1);
    expect(pyramidOf({ widthPx: 257, heightPx: 1 }).levels).toHaveLength(2);
    expect(pyramidOf({ widthPx: 65_536, heightPx: 1 }).levels).toHaveLength(9);
  });

  it('covers the image once at every level', () => {
    for (const level of pyramid.levels) {
      const tiles = tilesOfLevel(pyramid, level);
      expect(tiles).toHaveLength(level.columns * level.rows);
      const levelArea = tiles.reduce((sum, { levelRectPx }) => sum + levelRectPx.width * levelRectPx.height, 0);
      expect(levelArea).toBe(level.widthPx * level.heightPx);
      const imageArea = tiles.reduce((sum, { imageRectPx }) => sum + imageRectPx.width * imageRectPx.height, 0);
      expect(imageArea).toBeCloseTo(1001 * 600, 6);
    }
  });

  it('cuts the last column and row where the image ends', () => {
    const last = tilesOfLevel(pyramid, { level: 2, widthPx: 1001, heightPx: 600, columns: 4, rows: 3 }).at(-1);
    expect(last).toEqual({
      level: 2,
      column: 3,
      row: 2,
      levelRectPx: { x: 768, y: 512, width: 233, height: 88 },
      imageRectPx: { x: 768, y: 512, width: 233, height: 88 },
    });
  });

  it.each([0, -5, 1.5, Number.NaN, Number.POSITIVE_INFINITY])('is refused for a width of %f', (widthPx) => {
    expect(() => pyramidOf({ widthPx, heightPx: 10 })).toThrow(
      expect.objectContaining({ code: 'non-positive-dimension', field: 'widthPx' }),
    );
  });
});

describe('the tiles a view needs', () => {
  it.each([
    [0.1, 0],
    [0.25, 0],
    [0.26, 1],
    [0.5, 1],
    [0.51, 2],
    [1, 2],
    [8, 2],
  ])('at %f screen px per image px come from level %i', (screenPxPerImagePx, level) => {
    expect(tilesForView(pyramid, { imageRectPx: whole, screenPxPerImagePx }).level.level).toBe(level);
  });

  it('are those that touch what is seen', () => {
    const { tiles } = tilesForView(pyramid, {
      imageRectPx: { x: 256, y: 100, width: 257, height: 100 },
      screenPxPerImagePx: 1,
    });
    expect(tiles.map((tile) => [tile.column, tile.row])).toEqual([
      [1, 0],
      [2, 0],
    ]);
  });

  it('stop at the edge of the image when the view reaches beyond', () => {
    const around = { x: -500, y: -500, width: 5000, height: 5000 };
    expect(tilesForView(pyramid, { imageRectPx: around, screenPxPerImagePx: 1 }).tiles).toHaveLength(12);
  });

  it('are none when the view is off the image', () => {
    const off = { x: 1001, y: 0, width: 50, height: 50 };
    expect(tilesForView(pyramid, { imageRectPx: off, screenPxPerImagePx: 1 }).tiles).toEqual([]);
  });
});
