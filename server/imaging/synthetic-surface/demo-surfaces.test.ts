import { describe, expect, it } from 'vitest';
import { DEMO_SURFACES } from './demo-surfaces.ts';

const viewOf = (caseCode: string, view: string) =>
  DEMO_SURFACES.find((surface) => surface.caseCode === caseCode && surface.view === view);

describe('the views of the demo cases', () => {
  it('show every one of the twelve cases in one to four views', () => {
    const counts = new Map<string, number>();
    for (const { caseCode } of DEMO_SURFACES) counts.set(caseCode, (counts.get(caseCode) ?? 0) + 1);
    expect([...counts.keys()]).toHaveLength(12);
    expect(Math.max(...counts.values())).toBeLessThanOrEqual(4);
  });

  it.each([
    ['0001', 'CAL-06', 1018, 116.4],
    ['0005', 'CAL-02', 890.9, 86.4],
    ['0012', 'CAL-06', 3091, 312.7],
  ])(
    'of case %s give the mirror and flaw in pixels its estimates are read from',
    (caseCode, calibration, radius, flaw) => {
      const shown = viewOf(caseCode, 'origin-and-mirror');
      const { spec } = shown ?? expect.fail('no such view');
      expect(shown?.calibration).toBe(calibration);
      expect((spec.mirrorRadiusUm ?? Number.NaN) / spec.pixelSizeUm).toBeCloseTo(radius, 6);
      expect((spec.flaw?.halfAxisDepthUm ?? Number.NaN) / spec.pixelSizeUm).toBeCloseTo(flaw, 6);
    },
  );

  it('keep the origin on the image wherever there is one', () => {
    const outside = DEMO_SURFACES.filter(
      ({ spec: { flaw, origin, widthPx, heightPx } }) =>
        flaw && (origin.xPx < 0 || origin.yPx < 0 || origin.xPx > widthPx || origin.yPx > heightPx),
    );
    expect(outside).toEqual([]);
  });
});
