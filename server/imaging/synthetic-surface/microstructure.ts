import { cellAt } from './cells.ts';
import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';
import type { BodyTexture, FractureSurfaceSpec } from './surface-spec.ts';

/** Grain and pore sizes of each body, µm; null where it has none to see. */
const SIZES: Record<BodyTexture, { grainUm: number | null; poreUm: number | null; poreShare: number }> = {
  glass: { grainUm: null, poreUm: null, poreShare: 0 },
  fine: { grainUm: 2.6, poreUm: null, poreShare: 0 },
  coarse: { grainUm: 230, poreUm: 420, poreShare: 0.2 },
  porous: { grainUm: 74, poreUm: 150, poreShare: 0.55 },
};

/** Grains smaller than this on the image melt into the relief. */
const SMALLEST_GRAIN_PX = 6;

/**
 * Grains and pores of the body over the shaded grey, at a place in µm; null where the scale is too low to show any.
 */
export function createMicrostructure(noise: SurfaceNoise, spec: FractureSurfaceSpec) {
  const { grainUm, poreUm, poreShare } = SIZES[spec.body];
  if (grainUm === null || grainUm / spec.pixelSizeUm < SMALLEST_GRAIN_PX) return null;
  return (grey: number, alongUm: number, upUm: number): number => {
    const bend = 0.25 * noise.plane((alongUm / grainUm) * 1.7, (upUm / grainUm) * 1.7, 190);
    const grain = cellAt(noise, alongUm / grainUm + bend + 300, upUm / grainUm - bend);
    const faceted = grey + 19 * grain.own + 10 * (0.4 - grain.nearest) - 24 * Math.exp(-grain.gap * 11);
    if (poreUm === null) return faceted;
    const shape = 0.5 * noise.plane((alongUm / poreUm) * 1.9, (upUm / poreUm) * 1.9, 191);
    const pore = cellAt(noise, alongUm / poreUm + shape, upUm / poreUm + 0.7 * shape + 90);
    const size = 0.12 + 0.3 * (pore.own + 2 * poreShare - 1);
    if (size <= 0.1) return faceted;
    const hollow = 1 - smoothStep(size * 0.8, size, pore.nearest);
    const wall = 24 + 40 * smoothStep(0.2 * size, size, pore.nearest) + 10 * grain.own;
    const rim = 26 * Math.exp(-(((pore.nearest - size * 1.06) / 0.03) ** 2));
    return faceted * (1 - hollow) + wall * hollow + rim;
  };
}
