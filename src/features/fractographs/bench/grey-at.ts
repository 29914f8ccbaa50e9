import type { PointPx } from '#shared/contracts/marks.ts';
import type { TileStore } from './tile-store.ts';

let canvas: OffscreenCanvas | null = null;

/** Grey of the image under a place, 0 to 255, from the finest tile that is here; null where none covers it. */
export function greyAt(store: TileStore<ImageBitmap>, place: PointPx): number | null {
  const covering = store
    .held()
    .filter(({ tile: { imageRectPx: rect } }) => isIn(rect, place))
    .at(-1);
  if (!covering || typeof OffscreenCanvas === 'undefined') return null;
  canvas ??= new OffscreenCanvas(1, 1);
  const context = canvas.getContext('2d', { willReadFrequently: true });
  if (!context) return null;
  const { imageRectPx, levelRectPx } = covering.tile;
  const x = Math.floor(((place.x - imageRectPx.x) / imageRectPx.width) * levelRectPx.width);
  const y = Math.floor(((place.y - imageRectPx.y) / imageRectPx.height) * levelRectPx.height);
  context.drawImage(covering.picture, x, y, 1, 1, 0, 0, 1, 1);
  const [red, green, blue] = context.getImageData(0, 0, 1, 1).data;
  return (red + green + blue) / 3;
}

function isIn(rect: { x: number; y: number; width: number; height: number }, { x, y }: PointPx): boolean {
  return x >= rect.x && y >= rect.y && x < rect.x + rect.width && y < rect.y + rect.height;
}
