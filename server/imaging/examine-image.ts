import type { Metadata } from 'sharp';
import sharp from 'sharp';
import { readFileKind, type FileKind } from './file-kind.ts';
import { openImage, type ImageFacts, type ImageLimits } from './image-facts.ts';
import { readPixelSizeTag, type PixelSizeTag } from './pixel-size-tags.ts';
import { refusalOfDamage } from './refusal-of-damage.ts';

export type Examined =
  | { readonly kind: 'taken'; readonly facts: ImageFacts; readonly tag: PixelSizeTag | null }
  | { readonly kind: 'refused'; readonly reason: string };

/** Looks into a file, by its content alone: taken with what was found, or refused in plain words. */
export async function examineImage(file: string, limits: ImageLimits): Promise<Examined> {
  const read = await readFileKind(file);
  if (read.kind === 'refused') return read;
  try {
    // Without the limit here, so that the refusal can name the size.
    const found = await sharp(file, { limitInputPixels: false }).metadata();
    const reason = reasonAgainst(found, limits);
    if (reason) return { kind: 'refused', reason };
    const facts = await factsOf(file, read.format, found, limits);
    return { kind: 'taken', facts, tag: await readPixelSizeTag(file, read.format) };
  } catch (error) {
    return { kind: 'refused', reason: refusalOfDamage(error) };
  }
}

function reasonAgainst(found: Metadata, limits: ImageLimits): string | null {
  const megapixels = (found.width * (found.pageHeight ?? found.height)) / 1e6;
  if (megapixels * 1e6 > limits.largestImagePx)
    return `The image has ${tenth(megapixels)} megapixels; this laboratory takes up to ${tenth(limits.largestImagePx / 1e6)}.`;
  if (found.format === 'webp' && (found.pages ?? 1) > 1)
    return 'This is a moving picture. Bring in a single image as TIFF, PNG, JPEG or WebP.';
  if (found.depth !== 'uchar' && found.depth !== 'ushort')
    return 'The samples of this image are neither 8 nor 16 bit whole numbers. Bring it in with 8 or 16 bits a sample.';
  return null;
}

async function factsOf(file: string, format: FileKind, found: Metadata, limits: ImageLimits): Promise<ImageFacts> {
  return {
    format,
    widthPx: found.autoOrient.width,
    heightPx: found.autoOrient.height,
    bitDepth: found.depth === 'ushort' ? 16 : 8,
    grey: found.channels < 3,
    hasAlpha: found.hasAlpha,
    pages: format === 'TIFF' || format === 'BigTIFF' ? (found.pages ?? 1) : 1,
    shown: found.depth === 'ushort' ? await rangeOf(file, found, limits) : null,
  };
}

/** Least and largest sample over all colours alike, so that no colour shifts against another. */
async function rangeOf(file: string, found: Metadata, limits: ImageLimits): Promise<{ from: number; to: number }> {
  const { channels } = await openImage(file, limits).stats();
  const colours = found.hasAlpha ? channels.slice(0, -1) : channels;
  return { from: Math.min(...colours.map((each) => each.min)), to: Math.max(...colours.map((each) => each.max)) };
}

function tenth(value: number): string {
  return String(Math.round(value * 10) / 10);
}
