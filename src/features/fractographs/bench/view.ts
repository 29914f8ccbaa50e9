import type { PointPx } from '#shared/contracts/marks.ts';
import type { RectPx } from '#shared/numeric/imaging/pyramid.ts';

/** A place on the stage, screen px from its upper left corner. */
export type PointScreenPx = { readonly x: number; readonly y: number };
export type StageSize = { readonly widthScreenPx: number; readonly heightScreenPx: number };
export type ImageSize = { readonly widthPx: number; readonly heightPx: number };

/** What part of the image is seen and how large. */
export type View = {
  /** The image px at the middle of the stage. */
  readonly centrePx: PointPx;
  readonly screenPxPerImagePx: number;
  /** Mirrored left to right, as a mating face is laid beside the first. */
  readonly turnedOver: boolean;
};

/** One image px may fill this many screen px, so that single pixels can be told apart. */
const closest = 48;
// Farther than half the fit there is nothing to be seen.
const farthestOfFit = 0.5;

export function toScreen(view: View, stage: StageSize, point: PointPx): PointScreenPx {
  const side = view.turnedOver ? -1 : 1;
  return {
    x: stage.widthScreenPx / 2 + side * (point.x - view.centrePx.x) * view.screenPxPerImagePx,
    y: stage.heightScreenPx / 2 + (point.y - view.centrePx.y) * view.screenPxPerImagePx,
  };
}

export function toImage(view: View, stage: StageSize, point: PointScreenPx): PointPx {
  const side = view.turnedOver ? -1 : 1;
  return {
    x: view.centrePx.x + (side * (point.x - stage.widthScreenPx / 2)) / view.screenPxPerImagePx,
    y: view.centrePx.y + (point.y - stage.heightScreenPx / 2) / view.screenPxPerImagePx,
  };
}

/** Screen px per image px at which the whole image is just seen. */
export function fitScale(image: ImageSize, stage: StageSize): number {
  return Math.min(stage.widthScreenPx / image.widthPx, stage.heightScreenPx / image.heightPx);
}

/** The whole image in the middle of the stage. */
export function fitView(image: ImageSize, stage: StageSize, turnedOver = false): View {
  return {
    centrePx: { x: image.widthPx / 2, y: image.heightPx / 2 },
    screenPxPerImagePx: fitScale(image, stage),
    turnedOver,
  };
}

/** Closer or farther, with the image px under `about` staying where it is. */
export function zoomedAbout(
  view: View,
  stage: StageSize,
  image: ImageSize,
  about: PointScreenPx,
  factor: number,
): View {
  const kept = toImage(view, stage, about);
  const fit = fitScale(image, stage);
  const wanted = view.screenPxPerImagePx * factor;
  const screenPxPerImagePx = Math.min(Math.max(wanted, fit * farthestOfFit), Math.max(closest, fit));
  const zoomed = { ...view, screenPxPerImagePx };
  const now = toImage(zoomed, stage, about);
  return onImage(
    {
      ...zoomed,
      centrePx: { x: zoomed.centrePx.x + kept.x - now.x, y: zoomed.centrePx.y + kept.y - now.y },
    },
    image,
  );
}

/** The image pulled along by screen px. */
export function panned(view: View, image: ImageSize, by: PointScreenPx): View {
  const side = view.turnedOver ? -1 : 1;
  const { x, y } = view.centrePx;
  const centrePx = { x: x - (side * by.x) / view.screenPxPerImagePx, y: y - by.y / view.screenPxPerImagePx };
  return onImage({ ...view, centrePx }, image);
}

/** The image cannot be pulled wholly out of sight: the middle of the stage stays on it. */
export function onImage(view: View, image: ImageSize): View {
  const { x, y } = view.centrePx;
  return {
    ...view,
    centrePx: { x: Math.min(Math.max(x, 0), image.widthPx), y: Math.min(Math.max(y, 0), image.heightPx) },
  };
}

/** The part of the image plane that the stage shows; it may reach beyond the image. */
export function seenRectPx(view: View, stage: StageSize): RectPx {
  const width = stage.widthScreenPx / view.screenPxPerImagePx;
  const height = stage.heightScreenPx / view.screenPxPerImagePx;
  return { x: view.centrePx.x - width / 2, y: view.centrePx.y - height / 2, width, height };
}
