import type { SurfaceNoise } from './noise.ts';

/** Where the ripples come from, mirror radii from the origin, and how many cross one radius. */
const SOURCES = [
  { along: -1.9, depth: -0.1, perRadius: 4.6, strength: 1 },
  { along: 1.75, depth: 0.05, perRadius: 5.2, strength: 0.85 },
] as const;

/**
 * Gentle crossing ripples over the mirror, as height in px; along and depth in mirror radii from the origin.
 *
 * sizePx: mirror radius times the strength wanted, 0 to 1.
 */
export function createWallnerLines(noise: SurfaceNoise, sizePx: number) {
  return (along: number, depth: number): number => {
    let height = 0;
    for (const source of SOURCES) {
      const dx = along - source.along;
      // flattened: the lines lean over as the front outruns the ripple
      const dy = (depth - source.depth) * 0.8;
      const phase = Math.sqrt(dx * dx + dy * dy) * source.perRadius + 0.05 * noise.plane(along * 2.2, depth * 2.2, 4);
      const line = Math.floor(phase);
      const within = (phase - line - 0.5) * 2;
      const own = 0.55 + 0.45 * noise.speck(line, 77 + source.perRadius * 10);
      const crest = Math.exp(-within * within * 26) + 0.28 * Math.exp(-(within - 0.42) * (within - 0.42) * 60);
      height += source.strength * own * crest;
    }
    return height * sizePx * 0.008;
  };
}
