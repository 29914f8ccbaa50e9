import { describe, expect, it } from 'vitest';
import { placeFlaw, type FlawPlaceEntered } from './place-flaw.ts';

const pore: FlawPlaceEntered = { entered: 'depth of the centre', belowFaceMm: 0.11, halfAxisMm: 0.045 };

describe('an interior flaw below the tensile face', () => {
  it('has its cover worked out from the depth of its centre, and the other way round', () => {
    const byDepth = placeFlaw(pore);
    expect(byDepth).toMatchObject({ kind: 'interior', centreDepthMm: 0.11 });
    if (byDepth.kind === 'refused') throw new Error('expected a place');
    expect(byDepth.coverMm).toBeCloseTo(0.065, 12);
    const byCover = placeFlaw({ ...pore, entered: 'cover', belowFaceMm: 0.065 });
    expect(byCover).toMatchObject({ kind: 'interior', coverMm: 0.065 });
    if (byCover.kind === 'refused') throw new Error('expected a place');
    expect(byCover.centreDepthMm).toBeCloseTo(0.11, 12);
  });

  it('counts as a surface flaw when its cover is less than half its half-axis', () => {
    expect(placeFlaw({ entered: 'cover', belowFaceMm: 0.024, halfAxisMm: 0.05 })).toMatchObject({ kind: 'surface' });
    expect(placeFlaw({ entered: 'cover', belowFaceMm: 0.026, halfAxisMm: 0.05 })).toMatchObject({ kind: 'interior' });
    expect(placeFlaw({ entered: 'cover', belowFaceMm: 0, halfAxisMm: 0.05 })).toMatchObject({ kind: 'surface' });
  });

  it.each([
    [{ belowFaceMm: 0.04 }, 'outside-validity-range', 'belowFaceMm'],
    [{ belowFaceMm: Number.NaN }, 'non-finite-input', 'belowFaceMm'],
    [{ halfAxisMm: 0 }, 'non-positive-flaw-size', 'halfAxisMm'],
  ])('is refused as such for %o', (wrong, code, field) => {
    expect(placeFlaw({ ...pore, ...wrong })).toEqual({ kind: 'refused', code, field });
  });
});
