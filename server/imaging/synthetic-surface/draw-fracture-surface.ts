import { drawFlaw } from './flaw.ts';
import { createNoise } from './noise.ts';
import { raiseRelief } from './relief.ts';
import { burnScaleBar } from './scale-bar.ts';
import { developGrey, shadeRelief } from './shading.ts';
import type { FractureSurface, FractureSurfaceSpec } from './surface-spec.ts';
import { truthOf } from './surface-truth.ts';

/**
 * Draws a fracture surface, 8-bit grey, one byte a pixel, rows from the top, with all that is known of it.
 *
 * The same spec gives the same bytes; the same seed at another pixel size gives the same piece at another
 * magnification. About 1 s for 2 megapixels.
 * @throws RangeError for a size, pixel size, flaw or mirror that is not above zero.
 */
export function drawFractureSurface(spec: FractureSurfaceSpec): FractureSurface {
  const lengths = [spec.widthPx, spec.heightPx, spec.pixelSizeUm, spec.mirrorRadiusUm ?? 1, spec.scaleBarUm ?? 1];
  if (spec.flaw) lengths.push(spec.flaw.halfAxisDepthUm, spec.flaw.halfAxisAlongUm);
  if (!lengths.every((length) => Number.isFinite(length) && length > 0))
    throw new RangeError('A synthetic surface needs sizes above zero');
  const noise = createNoise(spec.seed);
  const relief = raiseRelief(noise, spec);
  const sheet = { shaded: shadeRelief(noise, spec, relief), insidePx: relief.insidePx };
  for (const other of spec.bystanders ?? [])
    drawFlaw(noise, spec, { ...other, upUm: other.depthUm - spec.originDepthUm }, sheet);
  if (spec.flaw) drawFlaw(noise, spec, { ...spec.flaw, alongUm: 0, upUm: 0 }, sheet);
  const grey = developGrey(noise, spec, sheet.shaded);
  const scaleBar = burnScaleBar(grey, spec);
  return { grey, widthPx: spec.widthPx, heightPx: spec.heightPx, truth: truthOf(noise, spec, scaleBar) };
}
