import type { SurfaceNoise } from './noise.ts';

export type Cell = {
  /** Distance to the nearest centre, cell sizes. */ nearest: number;
  /** Distance to the second nearest centre less the nearest: 0 on a boundary between grains. */ gap: number;
  /** Own value of the grain, −1 to 1. */ own: number;
};

/** The grain of a packed, rounded texture (cell size 1) at a place. */
export function cellAt(noise: SurfaceNoise, x: number, y: number): Cell {
  const ix = Math.floor(x);
  const iy = Math.floor(y);
  let nearest = 9;
  let second = 9;
  let ownX = ix;
  let ownY = iy;
  for (let cy = iy - 1; cy <= iy + 1; cy++)
    for (let cx = ix - 1; cx <= ix + 1; cx++) {
      const dx = cx + 0.5 + 0.42 * noise.speck(cx, cy) - x;
      const dy = cy + 0.5 + 0.42 * noise.speck(cx + 7919, cy - 104) - y;
      const distance = Math.sqrt(dx * dx + dy * dy);
      if (distance < nearest) {
        second = nearest;
        nearest = distance;
        ownX = cx;
        ownY = cy;
      } else if (distance < second) second = distance;
    }
  return { nearest, gap: second - nearest, own: noise.speck(ownX - 3301, ownY + 557) };
}
