import type { SurfaceNoise } from './noise.ts';
import { smoothStep } from './noise.ts';

const FULL_TURN = 2 * Math.PI;

/** Ridges of a mirror radius at the boundary, and how fast they widen: spacing ~ radius to this power. */
const SPACING_AT_MIRROR = 0.024;
const WIDENING = 0.55;
const FINEST_PX = 4.5;

/** Streaks are this many times longer than wide: broad, middle, fine. */
const STRETCH = [14, 9, 5] as const;

/** Pointed crests on low ground. */
const crest = (n: number) => (n > 0 ? n * Math.sqrt(n) : 0);

/**
 * Radial ridges that widen outward, as height in px.
 *
 * turn: 1 to 2 round the origin; logRadius: natural logarithm of radiusPx over the reference radius.
 * Ridge counts round the turn are powers of two, so the same ridges stand at every magnification.
 */
export function createHackle(noise: SurfaceNoise, referenceRadiusPx: number) {
  const logReference = Math.log(referenceRadiusPx);
  const logFinest = Math.log(FINEST_PX);
  const logSpacingAtMirror = logReference + Math.log(SPACING_AT_MIRROR);
  const logTurnAtMirror = logReference + Math.log(FULL_TURN);
  return (turn: number, logRadius: number, radiusPx: number): number => {
    const logSpacing = Math.max(logFinest, logSpacingAtMirror + WIDENING * logRadius);
    const level = Math.max(3, (logTurnAtMirror + logRadius - logSpacing) / Math.LN2);
    const lower = Math.floor(level);
    const share = smoothStep(0.3, 0.7, level - lower);
    const turnPx = FULL_TURN * radiusPx;
    let height = 0;
    for (let step = 0; step < 2; step++) {
      const weight = step === 0 ? 1 - share : share;
      if (weight < 0.01) continue;
      const octave = lower + step;
      const count = 1 << octave;
      const along = (logRadius * count) / FULL_TURN;
      const broad = noise.ring(turn * count, along / STRETCH[0], count, octave);
      const middle = noise.ring(turn * count * 2, (along * 2) / STRETCH[1], count * 2, octave + 20);
      const fine = noise.ring(turn * count * 4, (along * 4) / STRETCH[2], count * 4, octave + 40);
      height +=
        weight *
        (turnPx / count) *
        (0.36 * broad + 0.34 * crest(broad) + 0.32 * crest(middle) + 0.12 * middle + 0.13 * fine);
    }
    return height;
  };
}
