import { describe, expect, it } from 'vitest';
import { chamferedSection } from './chamfered-section.ts';
import { halfChamferedSection } from './half-chamfered-section.ts';
import { roundedSection } from './rounded-section.ts';

const section = { widthMm: 4, depthMm: 3 };

/** Second moment about mid-depth by adding up thin layers; for sections alike above and below. */
function addedUpMm4(widthAtMm: (fromFaceMm: number) => number): number {
  const layers = 200_000;
  const thicknessMm = 1.5 / layers;
  let sum = 0;
  for (let layer = 0; layer < layers; layer += 1) {
    const fromFaceMm = (layer + 0.5) * thicknessMm;
    sum += widthAtMm(fromFaceMm) * (1.5 - fromFaceMm) ** 2 * thicknessMm;
  }
  return 2 * sum;
}

describe('the second moment of a bar with worked edges', () => {
  it('is 9 − (0.0144/9)(0.0144 + ½ × 8.76²) for four chamfers of 0.12 mm on 3 × 4', () => {
    const { secondMomentMm4, stressFactor } = chamferedSection({ ...section, chamferLegMm: 0.12 });
    expect(secondMomentMm4).toBeCloseTo(9 - (0.0144 / 9) * (0.0144 + 8.76 ** 2 / 2), 12);
    expect(stressFactor).toBeCloseTo(9 / secondMomentMm4, 12);
  });

  it('is what thin layers add up to, chamfered and rounded', () => {
    const chamfered = addedUpMm4((e) => (e < 0.2 ? 4 - 2 * (0.2 - e) : 4));
    expect(chamferedSection({ ...section, chamferLegMm: 0.2 }).secondMomentMm4).toBeCloseTo(chamfered, 7);
    const rounded = addedUpMm4((e) => (e < 0.2 ? 4 - 2 * (0.2 - Math.sqrt(0.04 - (0.2 - e) ** 2)) : 4));
    expect(roundedSection({ ...section, edgeRadiusMm: 0.2 }).secondMomentMm4).toBeCloseTo(rounded, 6);
  });

  it('is that of the sharp bar without edges, and that of a rod when nothing flat is left', () => {
    expect(chamferedSection({ ...section, chamferLegMm: 0 })).toEqual({ secondMomentMm4: 9, stressFactor: 1 });
    expect(halfChamferedSection({ ...section, chamferLegMm: 0 })).toMatchObject({
      stressFactor: 1,
      tensileFibreMm: 1.5,
    });
    const rod = roundedSection({ widthMm: 4, depthMm: 4, edgeRadiusMm: 2 });
    expect(rod.secondMomentMm4).toBeCloseTo((Math.PI * 4 ** 4) / 64, 9);
  });

  it('loses less by rounding than by chamfers of the same size, and by two chamfers than by four', () => {
    const four = chamferedSection({ ...section, chamferLegMm: 0.2 }).stressFactor;
    expect(roundedSection({ ...section, edgeRadiusMm: 0.2 }).stressFactor).toBeLessThan(four);
    expect(halfChamferedSection({ ...section, chamferLegMm: 0.2 }).stressFactor).toBeLessThan(four);
  });

  it('raises the stress alike in inches and in millimetres', () => {
    const larger = { widthMm: 4 * 25.4, depthMm: 3 * 25.4, chamferLegMm: 0.12 * 25.4 };
    const factor = halfChamferedSection({ ...section, chamferLegMm: 0.12 }).stressFactor;
    expect(halfChamferedSection(larger).stressFactor).toBeCloseTo(factor, 12);
  });

  it.each([
    [Number.NaN, 'non-finite-input'],
    [-0.1, 'non-positive-dimension'],
    [1.51, 'chamfer-too-large'],
  ])('is refused for an edge of %s', (edgeMm, code) => {
    const chamfer = { ...section, chamferLegMm: edgeMm };
    const refusal = expect.objectContaining({ code, field: 'chamferLegMm' });
    expect(() => chamferedSection(chamfer)).toThrow(refusal);
    expect(() => halfChamferedSection(chamfer)).toThrow(refusal);
    const round = expect.objectContaining({ code, field: 'edgeRadiusMm' });
    expect(() => roundedSection({ ...section, edgeRadiusMm: edgeMm })).toThrow(round);
  });

  it('is refused without a width before an edge is looked at', () => {
    const refusal = expect.objectContaining({ code: 'non-positive-dimension', field: 'widthMm' });
    expect(() => chamferedSection({ widthMm: 0, depthMm: 3, chamferLegMm: 9 })).toThrow(refusal);
  });
});
