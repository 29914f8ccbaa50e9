const SIDE = 256;
const MASK = SIDE - 1;
/** Keeps lattice numbers positive, so truncation is floor. A multiple of SIDE. */
const SHIFT = 1 << 20;

export type SurfaceNoise = {
  /** Smooth field over the plane, about −1 to 1, feature size 1. */ plane: (
    x: number,
    y: number,
    layer: number,
  ) => number;
  /** As plane, but repeating after `period` in x (a power of two), so a full turn closes without a seam. */
  ring: (x: number, y: number, period: number, layer: number) => number;
  /** Unrelated value for each whole-numbered place, −1 to 1. */ speck: (x: number, y: number) => number;
};

/** Random numbers 0 to 1 from a whole-numbered seed (mulberry32); the same in every engine. */
export function seededRandom(seed: number): () => number {
  let state = (seed * 2654435761) >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/** Smooth step from 0 at `from` to 1 at `to`. */
export function smoothStep(from: number, to: number, x: number): number {
  const t = Math.min(1, Math.max(0, (x - from) / (to - from)));
  return t * t * (3 - 2 * t);
}

const fade = (t: number) => t * t * t * (t * (t * 6 - 15) + 10);

const at = (table: Float32Array, k: number) => table[k] ?? 0;

/** A class, not closures: the engine inlines shared methods, and drawing asks for noise a hundred million times. */
class LatticeNoise implements SurfaceNoise {
  private readonly seed: number;
  private readonly value: Float32Array;
  private readonly slopeX = new Float32Array(SIDE * SIDE);
  private readonly slopeY = new Float32Array(SIDE * SIDE);

  constructor(seed: number) {
    this.seed = seed;
    const random = seededRandom(seed);
    this.value = Float32Array.from({ length: SIDE * SIDE }, () => random() * 2 - 1);
    for (let k = 0; k < SIDE * SIDE; k++) {
      const angle = random() * 2 * Math.PI;
      this.slopeX[k] = 1.5 * Math.cos(angle);
      this.slopeY[k] = 1.5 * Math.sin(angle);
    }
  }

  plane(x: number, y: number, layer: number): number {
    const { slopeX, slopeY } = this;
    const px = x + SHIFT + layer * 37.31;
    const py = y + SHIFT + layer * 71.17;
    const ix = px | 0;
    const iy = py | 0;
    const fx = px - ix;
    const fy = py - iy;
    const x0 = ix & MASK;
    const x1 = (ix + 1) & MASK;
    const y0 = (iy & MASK) * SIDE;
    const y1 = ((iy + 1) & MASK) * SIDE;
    const u = fade(fx);
    const a = at(slopeX, y0 + x0) * fx + at(slopeY, y0 + x0) * fy;
    const b = at(slopeX, y0 + x1) * (fx - 1) + at(slopeY, y0 + x1) * fy;
    const c = at(slopeX, y1 + x0) * fx + at(slopeY, y1 + x0) * (fy - 1);
    const d = at(slopeX, y1 + x1) * (fx - 1) + at(slopeY, y1 + x1) * (fy - 1);
    const upper = a + (b - a) * u;
    return upper + (c + (d - c) * u - upper) * fade(fy);
  }

  ring(x: number, y: number, period: number, layer: number): number {
    const px = x + period * 4;
    const py = y + SHIFT + layer * 17.77;
    const ix = px | 0;
    const iy = py | 0;
    const fx = px - ix;
    const left = ix & (period - 1);
    const right = (ix + 1) & (period - 1);
    const shift = layer * 101;
    const x0 = (left + shift) & MASK;
    const x1 = (right + shift) & MASK;
    // a period beyond the table would repeat inside one turn: let the rows differ by the lap
    const lap0 = (left >> 8) * 29;
    const lap1 = (right >> 8) * 29;
    const u = fx * fx * (3 - 2 * fx);
    const fy = py - iy;
    const a = at(this.value, ((iy + lap0) & MASK) * SIDE + x0);
    const b = at(this.value, ((iy + lap1) & MASK) * SIDE + x1);
    const c = at(this.value, ((iy + 1 + lap0) & MASK) * SIDE + x0);
    const d = at(this.value, ((iy + 1 + lap1) & MASK) * SIDE + x1);
    const upper = a + (b - a) * u;
    return upper + (c + (d - c) * u - upper) * (fy * fy * (3 - 2 * fy));
  }

  speck(x: number, y: number): number {
    let h = Math.imul(x, 374761393) + Math.imul(y, 668265263) + Math.imul(this.seed, 974634211);
    h = Math.imul(h ^ (h >>> 13), 1274126177);
    h ^= h >>> 16;
    return (h >>> 0) / 2147483648 - 1;
  }
}

/** Noise fields over lattice tables filled once from the seed. */
export function createNoise(seed: number): SurfaceNoise {
  return new LatticeNoise(seed);
}
