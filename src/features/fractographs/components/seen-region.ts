import type { MarkView, PointPx } from '#shared/contracts/marks.ts';
import { outlineOf } from '../bench/kinds/shapes/shape-acts.ts';

/** The part of an image that is shown, image px: its middle, its width and its height, all of it on the image. */
export type SeenRegion = { readonly centre: PointPx; readonly acrossPx: number; readonly downPx: number };

// Marks keep this share of the frame's edge free on every side.
const marginShare = 0.16;
// Never nearer than this, so that one point does not fill the frame with a few pixels.
const leastAcrossPx = 240;

/**
 * The part of the image that holds its marks, in the shape of the frame (height over width) as far as the image has it,
 * else the whole image: as near as the marks allow and never past what the image has.
 */
export function regionOf(
  image: { widthPx: number; heightPx: number },
  marks: readonly MarkView[],
  heightOverWidth: number,
): SeenRegion {
  const points = marks.flatMap((mark) => [...outlineOf(mark.geometry)]);
  if (points.length === 0)
    return {
      centre: { x: image.widthPx / 2, y: image.heightPx / 2 },
      acrossPx: image.widthPx,
      downPx: image.heightPx,
    };
  const [left, right] = [Math.min(...points.map(({ x }) => x)), Math.max(...points.map(({ x }) => x))];
  const [top, bottom] = [Math.min(...points.map(({ y }) => y)), Math.max(...points.map(({ y }) => y))];
  const free = 1 - 2 * marginShare;
  const wanted = Math.max(leastAcrossPx, (right - left) / free, (bottom - top) / free / heightOverWidth);
  const acrossPx = Math.min(image.widthPx, wanted);
  const downPx = Math.min(image.heightPx, Math.max(acrossPx * heightOverWidth, (bottom - top) / free));
  return {
    centre: {
      x: kept((left + right) / 2, acrossPx / 2, image.widthPx),
      y: kept((top + bottom) / 2, downPx / 2, image.heightPx),
    },
    acrossPx,
    downPx,
  };
}

/** A middle moved so that the half on each side stays on the image, where the image is large enough. */
function kept(middle: number, half: number, size: number): number {
  if (2 * half >= size) return size / 2;
  return Math.min(Math.max(middle, half), size - half);
}
