import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';

export type GrainSlopes = {
  /** Steepness of a wave inside the mirror. */ calm: number;
  /** Steepness it gains in the mist and beyond. */ rough: number;
};

/** Waves lower than this, px, change no grey. */
const UNSEEN_PX = 0.012;

type Octave = { cosPerUm: number; sinPerUm: number; calmPx: number; roughPx: number; layer: number };

/**
 * Texture of the body in every direction, as height in px: octaves at 2^k µm, weighed by how many px they span, so
 * that one piece keeps its features from one magnification to the next.
 *
 * slopesAt: steepness wanted of a wave, given its length in px. The field takes the place in µm and the share of the
 * rough part, 0 to 1.
 */
export function createGrain(noise: SurfaceNoise, pixelSizeUm: number, slopesAt: (wavePx: number) => GrainSlopes) {
  const octaves: Octave[] = [];
  for (let k = -6; k <= 14; k++) {
    const wavePx = 2 ** k / pixelSizeUm;
    const { calm, rough } = slopesAt(wavePx);
    const seen = wavePx * smoothStep(1.6, 2.6, wavePx);
    if ((calm + rough) * seen > UNSEEN_PX)
      // each octave turned by another angle, or the lattices would add up to a grid
      octaves.push({
        cosPerUm: Math.cos(k * 1.1 + 0.5) * 2 ** -k,
        sinPerUm: Math.sin(k * 1.1 + 0.5) * 2 ** -k,
        calmPx: calm * seen,
        roughPx: rough * seen,
        layer: k + 60,
      });
  }
  return (alongUm: number, depthUm: number, roughShare: number): number => {
    let height = 0;
    for (const { cosPerUm, sinPerUm, calmPx, roughPx, layer } of octaves) {
      const size = calmPx + roughShare * roughPx;
      if (size < UNSEEN_PX) continue;
      const x = alongUm * cosPerUm - depthUm * sinPerUm;
      const y = alongUm * sinPerUm + depthUm * cosPerUm;
      height += size * noise.plane(x, y, layer);
    }
    return height;
  };
}
