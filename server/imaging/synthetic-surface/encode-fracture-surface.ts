import { writeFile } from 'node:fs/promises';
import type { Sharp } from 'sharp';
import sharp from 'sharp';
import { drawFractureSurface } from './draw-fracture-surface.ts';
import type { FractureSurface, FractureSurfaceSpec, SurfaceTruth } from './surface-spec.ts';

export type SurfaceFormat = 'tiff' | 'png' | 'jpeg';

/** Pixels in a millimetre, for the resolution tags of a file. */
const pixelsPerMm = (pixelSizeUm: number) => 1000 / pixelSizeUm;

/**
 * A drawn surface as a file of 8-bit grey.
 *
 * density: writes the pixel size into the file's resolution tags; otherwise the file tells no scale but its bar.
 */
export function encodeFractureSurface(
  surface: FractureSurface,
  format: SurfaceFormat,
  options: { density?: boolean } = {},
): Promise<Buffer> {
  const raw = { width: surface.widthPx, height: surface.heightPx, channels: 1 } as const;
  const perMm = options.density ? pixelsPerMm(surface.truth.pixelSizeUm) : undefined;
  const image = sharp(surface.grey, { raw }).toColourspace('b-w');
  if (format === 'jpeg') return withDensity(image.jpeg({ quality: 90 }), perMm).toBuffer();
  if (format === 'png') return withDensity(image.png({ compressionLevel: 6 }), perMm).toBuffer();
  return image
    .tiff({ compression: 'deflate', predictor: 'horizontal', ...(perMm ? { xres: perMm, yres: perMm } : {}) })
    .toBuffer();
}

const PER_INCH = 25.4;

function withDensity(image: Sharp, perMm: number | undefined): Sharp {
  return perMm ? image.withMetadata({ density: perMm * PER_INCH }) : image;
}

/** Draws a surface into a TIFF file with resolution tags and tells what is known of it. */
export async function writeFractureTiff(spec: FractureSurfaceSpec, path: string): Promise<SurfaceTruth> {
  const surface = drawFractureSurface(spec);
  await writeFile(path, await encodeFractureSurface(surface, 'tiff', { density: true }));
  return surface.truth;
}
