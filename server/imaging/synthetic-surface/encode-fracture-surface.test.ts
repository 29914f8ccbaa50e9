import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { drawFractureSurface } from './draw-fracture-surface.ts';
import { encodeFractureSurface } from './encode-fracture-surface.ts';

const surface = drawFractureSurface({
  seed: 3,
  widthPx: 320,
  heightPx: 240,
  pixelSizeUm: 1.1,
  origin: { xPx: 160, yPx: 210 },
  originDepthUm: 0,
  flaw: { kind: 'pit', halfAxisDepthUm: 12, halfAxisAlongUm: 12 },
  mirrorRadiusUm: 90,
  scaleBarUm: 50,
  body: 'fine',
});

describe('a synthetic surface as a file', () => {
  it.each(['tiff', 'png'] as const)('keeps every grey in a %s of one channel', async (format) => {
    const file = await encodeFractureSurface(surface, format);
    const { data, info } = await sharp(file).toColourspace('b-w').raw().toBuffer({ resolveWithObject: true });
    expect(info).toMatchObject({ width: 320, height: 240, channels: 1 });
    expect(Buffer.compare(data, Buffer.from(surface.grey))).toBe(0);
  });

  it('tells the pixel size in the resolution tags when asked', async () => {
    const { density } = await sharp(await encodeFractureSurface(surface, 'tiff', { density: true })).metadata();
    expect(25_400 / (density ?? Number.NaN)).toBeCloseTo(1.1, 3);
  });

  it('comes as a JPEG as well', async () => {
    const { format } = await sharp(await encodeFractureSurface(surface, 'jpeg')).metadata();
    expect(format).toBe('jpeg');
  });
});
