import sharp from 'sharp';
import { drawFractureSurface } from './draw-fracture-surface.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

/** Glass broken in bend: origin below, Wallner lines across the mirror, mist, hackle. */
export const FRONTISPIECE: FractureSurfaceSpec = {
  seed: 19,
  widthPx: 1000,
  heightPx: 1250,
  pixelSizeUm: 2.2,
  origin: { xPx: 545, yPx: 1085 },
  originDepthUm: 0,
  flaw: { kind: 'surface-crack', halfAxisDepthUm: 112, halfAxisAlongUm: 124 },
  mirrorRadiusUm: 690,
  mistRatio: 1.3,
  scaleBarUm: null,
  body: 'glass',
  wallner: 0.8,
};

/** Draws the frontispiece of the sign-in page into a WebP file of about 100 kB. */
export async function writeFrontispiece(path: string): Promise<void> {
  const { grey, widthPx, heightPx } = drawFractureSurface(FRONTISPIECE);
  await sharp(grey, { raw: { width: widthPx, height: heightPx, channels: 1 } })
    // detector noise costs bytes and shows nothing at this size
    .blur(0.7)
    .webp({ quality: 50, effort: 6 })
    .toFile(path);
}
