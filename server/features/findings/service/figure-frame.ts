import type { MarkGeometry, PointPx } from '#shared/contracts/marks.ts';
import { outline, type FramePx } from '#shared/rules/marks-to-svg.ts';

// Figures of the text share one shape, so that pages of them stand in rows.
const heightOverWidth = 0.62;
// Strokes and words have their size at this width; the picture under them is finer by `sharpness`.
const widthOfFigurePx = 400;
export const sharpness = 3;
// Marks keep this share of the frame's edge free; one point alone does not fill it with a few pixels.
const marginShare = 0.16;
const leastAcrossPx = 240;

type ImageSize = { readonly widthPx: number; readonly heightPx: number };

/** The part of an image that holds the chosen marks with room about them; the whole image where there are none. */
export function frameAround(image: ImageSize, marks: readonly { geometry: MarkGeometry }[]): FramePx {
  const points: PointPx[] = marks.flatMap((mark) => outline(mark.geometry));
  if (points.length === 0) return { x: 0, y: 0, width: image.widthPx, height: image.heightPx };
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const wanted = Math.max(right - left, (bottom - top) / heightOverWidth) / (1 - 2 * marginShare);
  const width = Math.min(image.widthPx, image.heightPx / heightOverWidth, Math.max(leastAcrossPx, wanted));
  const height = width * heightOverWidth;
  return {
    x: within((left + right - width) / 2, image.widthPx - width),
    y: within((top + bottom - height) / 2, image.heightPx - height),
    width,
    height,
  };
}

/** The size a frame is drawn at, px. */
export function drawnSize(frame: FramePx): { widthPx: number; heightPx: number } {
  return { widthPx: widthOfFigurePx, heightPx: Math.round((widthOfFigurePx * frame.height) / frame.width) };
}

const within = (value: number, most: number) => Math.min(Math.max(0, value), Math.max(0, most));
