import { cropImage, type CropOrder } from './crop-image.ts';
import { cutPyramid, type Cut, type CutOrder } from './cut-pyramid.ts';
import { examineImage, type Examined } from './examine-image.ts';
import type { ImageLimits } from './image-facts.ts';
import { drawToFile, type DrawOrder } from './synthetic-surface/draw-to-file.ts';

export type ImageWork = {
  readonly examine: {
    readonly asked: { readonly file: string; readonly limits: ImageLimits };
    readonly gives: Examined;
  };
  readonly cut: { readonly asked: CutOrder; readonly gives: Cut };
  readonly crop: { readonly asked: CropOrder; readonly gives: Uint8Array };
  readonly draw: { readonly asked: DrawOrder; readonly gives: Uint8Array };
};

export type ImageOrder = {
  [Name in keyof ImageWork]: { name: Name; asked: ImageWork[Name]['asked'] };
}[keyof ImageWork];

/** What runs in the thread apart: every image is decoded here and never in the thread that answers requests. */
export default function work(order: ImageOrder): Promise<Examined | Cut | Uint8Array> {
  if (order.name === 'examine') return examineImage(order.asked.file, order.asked.limits);
  if (order.name === 'cut') return cutPyramid(order.asked);
  if (order.name === 'draw') return drawToFile(order.asked);
  return cropImage(order.asked);
}
