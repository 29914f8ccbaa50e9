import { describe, expect, it } from 'vitest';
import { drawFractureSurface } from './draw-fracture-surface.ts';
import type { FractureSurface, FractureSurfaceSpec } from './surface-spec.ts';

const spec: FractureSurfaceSpec = {
  seed: 11,
  widthPx: 1000,
  heightPx: 760,
  pixelSizeUm: 0.55,
  origin: { xPx: 500, yPx: 690 },
  originDepthUm: 0,
  flaw: { kind: 'pore', halfAxisDepthUm: 22, halfAxisAlongUm: 24 },
  mirrorRadiusUm: 165,
  scaleBarUm: 100,
  body: 'fine',
};

/** Grey steps between neighbours, squared, averaged over an arc from 20° to 160° and ± 4 px of radius. */
function roughnessAt({ grey, widthPx, truth }: FractureSurface, radiusPx: number): number {
  let sum = 0;
  let count = 0;
  for (let degrees = 20; degrees <= 160; degrees += 0.5)
    for (let off = -4; off <= 4; off++) {
      const angle = (degrees * Math.PI) / 180;
      const x = Math.floor(truth.origin.xPx + (radiusPx + off) * Math.cos(angle));
      const y = Math.floor(truth.origin.yPx - (radiusPx + off) * Math.sin(angle));
      const at = (dx: number, dy: number) => grey[(y + dy) * widthPx + x + dx] ?? 0;
      sum += (at(1, 0) - at(-1, 0)) ** 2 + (at(0, 1) - at(0, -1)) ** 2;
      count++;
    }
  return sum / count;
}

/** Radius at which the roughness has risen half way from the mirror's to the mist's, px. */
function roughnessRisePx(surface: FractureSurface): number {
  const radiusPx = surface.truth.mirror?.radiusPx ?? 0;
  const mirror = (roughnessAt(surface, 0.5 * radiusPx) + roughnessAt(surface, 0.65 * radiusPx)) / 2;
  const mist = (roughnessAt(surface, 1.15 * radiusPx) + roughnessAt(surface, 1.25 * radiusPx)) / 2;
  let at = 0.65 * radiusPx;
  while (roughnessAt(surface, at) < (mirror + mist) / 2) at += 1;
  return at;
}

/** Longest run of full white in the bar's middle row and the grey of the px after it. */
function readScaleBar({ grey, widthPx, truth }: FractureSurface): { whole: number; after: number } {
  const bar = truth.scaleBar;
  if (!bar) return { whole: 0, after: 0 };
  const row = (bar.yPx + Math.floor(bar.thicknessPx / 2)) * widthPx;
  let whole = 0;
  while (grey[row + bar.xPx + whole] === 255) whole++;
  return { whole, after: grey[row + bar.xPx + whole] ?? 0 };
}

describe('a synthetic fracture surface', () => {
  const surface = drawFractureSurface(spec);

  it('is the same to the byte for the same spec', () => {
    expect(Buffer.compare(drawFractureSurface(spec).grey, surface.grey)).toBe(0);
  });

  it('is another piece for another seed', () => {
    const other = drawFractureSurface({ ...spec, seed: 12 }).grey;
    const alike = other.filter((value, k) => value === surface.grey[k]).length;
    expect(alike / other.length).toBeLessThan(0.3);
  });

  it.each(['glass', 'fine'] as const)('turns rough at the mirror radius told, in a %s body', (body) => {
    const drawn = drawFractureSurface({ ...spec, body });
    expect(Math.abs(roughnessRisePx(drawn) / 300 - 1)).toBeLessThan(0.06);
  });

  it.each([11, 29, 54])('turns rough at the same radius whatever the piece (seed %i)', (seed) => {
    const drawn = drawFractureSurface({ ...spec, seed });
    expect(Math.abs(roughnessRisePx(drawn) / 300 - 1)).toBeLessThan(0.06);
  });

  it('carries a scale bar whose white is as long as told, to a twentieth of a pixel', () => {
    const { whole, after } = readScaleBar(surface);
    expect(whole).toBe(181);
    expect(Math.abs(whole + (after - 10) / 245 - 100 / 0.55)).toBeLessThan(0.05);
  });

  it('keeps full white for the scale bar', () => {
    const bare = drawFractureSurface({ ...spec, scaleBarUm: null });
    expect(Math.max(...bare.grey.subarray(0, 100_000))).toBeLessThan(250);
  });

  it('is dark below the tensile edge and in the pore', () => {
    const { grey, widthPx, truth } = surface;
    const mean = (x: number, y: number) => {
      let sum = 0;
      for (let j = -5; j <= 5; j++) for (let i = -5; i <= 5; i++) sum += grey[(y + j) * widthPx + x + i] ?? 0;
      return sum / 121;
    };
    const mirror = mean(truth.origin.xPx, truth.origin.yPx - 150);
    expect(mean(800, 750)).toBeLessThan(mirror / 3);
    expect(mean(truth.origin.xPx, truth.origin.yPx - 15)).toBeLessThan(mirror / 2);
  });

  it('knows its lengths in pixels and micrometres', () => {
    expect(surface.truth.mirror?.radiusPx).toBeCloseTo(300, 9);
    expect(surface.truth.flaw?.halfAxisDepthPx).toBeCloseTo(40, 9);
    expect(surface.truth.mirror?.mistOuterRadiusUm).toBeCloseTo(165 * 1.35, 9);
    expect(surface.truth.hackle.length).toBeGreaterThan(2);
  });

  it('shows the flaw on the other side of the centre on the mating face', () => {
    const offCentre = {
      ...spec,
      bystanders: [{ kind: 'pit', halfAxisDepthUm: 12, halfAxisAlongUm: 12, alongUm: 60, depthUm: 30 }],
    } as const;
    const greyAt = (face: 'first' | 'mate', xPx: number) =>
      drawFractureSurface({ ...offCentre, face }).grey[635 * 1000 + xPx];
    expect(greyAt('first', 609)).toBeLessThan(60);
    expect(greyAt('mate', 391)).toBeLessThan(60);
  });

  it.each([{ pixelSizeUm: 0 }, { mirrorRadiusUm: -1 }, { widthPx: Number.NaN }])('is refused with %o', (wrong) => {
    expect(() => drawFractureSurface({ ...spec, ...wrong })).toThrow(RangeError);
  });
});
