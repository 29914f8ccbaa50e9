import { describe, expect, it } from 'vitest';
import type { MarkView } from '#shared/contracts/marks.ts';
import { regionOf } from './seen-region.ts';

const aMirror = (left: number, right: number, top: number, bottom: number) =>
  ({
    kind: 'mirror',
    geometry: {
      shape: 'chain',
      points: [
        { x: left, y: bottom },
        { x: (left + right) / 2, y: top },
        { x: right, y: bottom },
      ],
    },
  }) as MarkView; // brand: only the geometry is looked at

const frame = 452 / 584;

describe('the part of a fractograph shown in a figure', () => {
  it('is the whole image while nothing is marked', () => {
    const region = regionOf({ widthPx: 2340, heightPx: 1420 }, [], frame);
    expect(region).toEqual({ centre: { x: 1170, y: 710 }, acrossPx: 2340, downPx: 1420 });
  });

  it('never reaches past an image that is flatter than the frame, so that marks stay on what they mark', () => {
    const { centre, acrossPx, downPx } = regionOf(
      { widthPx: 2340, heightPx: 1420 },
      [aMirror(162, 2198, 282, 1300)],
      frame,
    );
    expect(acrossPx).toBeLessThanOrEqual(2340);
    expect(downPx).toBe(1420);
    expect(centre.y).toBe(710);
  });

  it('holds a mirror taller than the frame', () => {
    const { centre, downPx } = regionOf({ widthPx: 900, heightPx: 3000 }, [aMirror(100, 800, 400, 2400)], frame);
    expect(centre.y - downPx / 2).toBeLessThanOrEqual(400);
    expect(centre.y + downPx / 2).toBeGreaterThanOrEqual(2400);
  });

  it('keeps the shape of the frame where the image has room for it', () => {
    const { acrossPx, downPx } = regionOf({ widthPx: 4000, heightPx: 4000 }, [aMirror(1500, 2500, 1500, 2000)], frame);
    expect(downPx / acrossPx).toBeCloseTo(frame, 9);
  });
});
