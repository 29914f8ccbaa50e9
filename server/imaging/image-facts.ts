import { z } from 'zod';
import type { Sharp } from 'sharp';
import sharp from 'sharp';

/** What was found in a file that is taken: all that cutting and cropping need to give the same picture again. */
export const ImageFacts = z.object({
  format: z.enum(['TIFF', 'BigTIFF', 'PNG', 'JPEG', 'WebP']),
  /** Size as looked at, turned as the file's orientation tag says, px. */
  widthPx: z.number().int().positive(),
  heightPx: z.number().int().positive(),
  bitDepth: z.number().int(),
  grey: z.boolean(),
  hasAlpha: z.boolean(),
  pages: z.number().int(),
  /** Of 16-bit samples: the least and largest found, shown as black and white, linear between; null for 8-bit. */
  shown: z.object({ from: z.number(), to: z.number() }).nullable(),
});
export type ImageFacts = z.infer<typeof ImageFacts>;

export type ImageLimits = {
  /** Most pixels of an image. */
  readonly largestImagePx: number;
  /** Longest time one pass over an image may take, s. */
  readonly longestPassS: number;
};

/** A reader of the file that gives up at the limits and at the first damage. */
export function openImage(file: string, limits: ImageLimits): Sharp {
  return sharp(file, {
    failOn: 'error', // a file without its end is damaged, an odd tag is not
    limitInputPixels: limits.largestImagePx,
    sequentialRead: true,
    page: 0,
    pages: 1,
  }).timeout({ seconds: limits.longestPassS });
}

/**
 * Brings an image to 8 bits for looking at: turned upright, over black where it is transparent, 16-bit samples linear
 * from the least to the largest found, so that nothing is clipped. Grey stays grey. The original is not touched.
 */
export function asSeen(image: Sharp, facts: ImageFacts, resized?: { widthPx: number; heightPx: number }): Sharp {
  let seen = image.autoOrient();
  if (resized) seen = seen.resize(resized.widthPx, resized.heightPx, { fit: 'fill' });
  if (facts.hasAlpha) seen = seen.flatten({ background: '#000000' });
  if (facts.shown) {
    const { from, to } = facts.shown;
    const stretch = 65_535 / Math.max(1, to - from);
    seen = seen.linear(stretch, -from * stretch);
  }
  return seen.toColourspace(facts.grey ? 'b-w' : 'srgb');
}

/** How the format reads beside the image, with what was done to show it. */
export function formatInWords(facts: ImageFacts): string {
  const words: string[] = [facts.format];
  if (facts.pages > 1) words.push(`first of ${facts.pages} pages`);
  if (facts.shown) words.push(`16 bit, shown linearly from ${facts.shown.from} to ${facts.shown.to}`);
  return words.join(', ');
}
