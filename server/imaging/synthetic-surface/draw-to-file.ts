import { drawFractureSurface } from './draw-fracture-surface.ts';
import { encodeFractureSurface, type SurfaceFormat } from './encode-fracture-surface.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

export type DrawOrder = {
  readonly spec: FractureSurfaceSpec;
  readonly format: SurfaceFormat;
  /** Writes the pixel size into the file's resolution tags. */
  readonly density: boolean;
};

/** Draws a surface and encodes it: the bytes of a file. */
export function drawToFile({ spec, format, density }: DrawOrder): Promise<Uint8Array> {
  return encodeFractureSurface(drawFractureSurface(spec), format, { density });
}
