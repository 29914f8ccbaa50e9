import { asSeen, openImage, type ImageFacts, type ImageLimits } from './image-facts.ts';

export type CropOrder = {
  readonly file: string;
  readonly facts: ImageFacts;
  readonly limits: ImageLimits;
  /** The point in the middle, image px, where the edges of the image leave room for it. */
  readonly x: number;
  readonly y: number;
  /** How much of the image the picture is wide, image px. */
  readonly acrossPx: number;
  /** Size of the picture, px. */
  readonly width: number;
  readonly height: number;
};

/** A small picture of the surface around a point, as WebP; near an edge it moves inwards and stays whole. */
export async function cropImage(order: CropOrder): Promise<Uint8Array> {
  const { facts } = order;
  const scale = Math.min(order.acrossPx / order.width, facts.widthPx / order.width, facts.heightPx / order.height);
  const width = Math.max(1, Math.floor(order.width * scale));
  const height = Math.max(1, Math.floor(order.height * scale));
  const left = Math.round(within(order.x - width / 2, facts.widthPx - width));
  const top = Math.round(within(order.y - height / 2, facts.heightPx - height));
  const cut = openImage(order.file, order.limits).autoOrient().extract({ left, top, width, height });
  return asSeen(cut, facts, { widthPx: order.width, heightPx: order.height }).webp({ quality: 84 }).toBuffer();
}

function within(value: number, most: number): number {
  return Math.min(Math.max(0, value), Math.max(0, most));
}
