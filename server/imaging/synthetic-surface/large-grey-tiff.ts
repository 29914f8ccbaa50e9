import sharp from 'sharp';
import { drawFractureSurface } from './draw-fracture-surface.ts';
import { seededRandom } from './noise.ts';

export type LargeGreySize = { widthPx: number; heightPx: number; seed: number };

type Sheet = { grey: Uint8Array; widthPx: number; heightPx: number };

const MIDDLE_GREY = 112;

/** A broad view to be stretched over the whole, and a close texture to be laid under it. */
function drawSheets({ widthPx, heightPx, seed }: LargeGreySize): { broad: Sheet; close: Sheet } {
  const broadWidth = Math.min(1400, widthPx);
  const broadHeight = Math.max(1, Math.round((broadWidth * heightPx) / widthPx));
  const common = { originDepthUm: 0, scaleBarUm: null, body: 'fine' } as const;
  const broad = drawFractureSurface({
    ...common,
    seed,
    widthPx: broadWidth,
    heightPx: broadHeight,
    pixelSizeUm: 1,
    origin: { xPx: broadWidth / 2, yPx: broadHeight * 0.9 },
    flaw: { kind: 'pore', halfAxisDepthUm: 40, halfAxisAlongUm: 46 },
    mirrorRadiusUm: 300,
  });
  const close = drawFractureSurface({
    ...common,
    seed: seed + 1,
    widthPx: 1024,
    heightPx: 1024,
    pixelSizeUm: 1,
    origin: { xPx: 512, yPx: 2600 },
    flaw: null,
    // all mirror: grain without direction can be turned over unseen
    mirrorRadiusUm: 1e5,
  });
  return { broad, close };
}

/** Row of the stretched broad view: between two of its rows, then between their pixels. */
function stretchRow(broad: Sheet, row: Float32Array, atRow: number): void {
  const upper = Math.min(broad.heightPx - 1, Math.floor(atRow));
  const lower = Math.min(broad.heightPx - 1, upper + 1);
  const share = atRow - Math.floor(atRow);
  for (let i = 0; i < broad.widthPx; i++) {
    const above = broad.grey[upper * broad.widthPx + i] ?? 0;
    row[i] = above + ((broad.grey[lower * broad.widthPx + i] ?? 0) - above) * share;
  }
  row[broad.widthPx] = row[broad.widthPx - 1] ?? 0;
}

/** Place in a tile that is turned over at every repeat, so that no seam shows. */
function foldedPlace(at: number, size: number): number {
  const place = at % (2 * size);
  return place < size ? place : 2 * size - 1 - place;
}

/**
 * Writes an uncompressed tiled 8-bit grey TIFF with texture at every zoom, for trying the bench on very large inputs.
 *
 * Cheap: two small surfaces are drawn, one stretched over the whole, one repeated under it. 100 megapixels take about
 * 3 s and one byte a pixel of memory besides what the file needs.
 */
export async function writeLargeGreyTiff(size: LargeGreySize, path: string): Promise<void> {
  const { widthPx, heightPx } = size;
  const { broad, close } = drawSheets(size);
  const random = seededRandom(size.seed);
  const grey = new Uint8Array(widthPx * heightPx);
  const row = new Float32Array(broad.widthPx + 1);
  const columnShare = (broad.widthPx - 1) / Math.max(1, widthPx - 1);
  for (let j = 0; j < heightPx; j++) {
    stretchRow(broad, row, (j * (broad.heightPx - 1)) / Math.max(1, heightPx - 1));
    const tileRow = foldedPlace(j, close.heightPx) * close.widthPx;
    const lift = (random() - 0.5) * 2;
    for (let i = 0; i < widthPx; i++) {
      const at = i * columnShare;
      const left = at | 0;
      const start = row[left] ?? 0;
      const broadGrey = start + ((row[left + 1] ?? 0) - start) * (at - left);
      const detail = (close.grey[tileRow + foldedPlace(i, close.widthPx)] ?? MIDDLE_GREY) - MIDDLE_GREY;
      // dark places (outer surface, pore) keep less of the texture
      grey[j * widthPx + i] = Math.min(250, Math.max(2, broadGrey + lift + detail * (broadGrey / 130)));
    }
  }
  await sharp(grey, { raw: { width: widthPx, height: heightPx, channels: 1 }, limitInputPixels: false })
    .toColourspace('b-w')
    .tiff({ compression: 'none', tile: true, tileWidth: 256, tileHeight: 256 })
    .toFile(path);
}
