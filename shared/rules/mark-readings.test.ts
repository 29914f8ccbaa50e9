import { describe, expect, it } from 'vitest';
import type { MarkGeometry, PointPx } from '../contracts/marks.ts';
import { readingText } from '../wording/mark-reading.ts';
import { markReadings, type LengthReading, type MarkReading, type OriginMark } from './mark-readings.ts';

const scale = { pixelSizeXUm: 0.5, pixelSizeYUm: 0.5, relativeUncertainty: 0.004 };
const originAt = (at: PointPx, originCode: OriginMark['originCode'] = 'P'): OriginMark => ({
  geometry: { shape: 'point', at },
  originCode,
});
const mirror = (...points: PointPx[]) => ({
  kind: 'mirror' as const,
  geometry: { shape: 'chain', points } satisfies MarkGeometry,
});

function lengthOf(readings: readonly MarkReading[], index = 0): LengthReading {
  const reading = readings[index];
  if (!reading || reading.quantity === 'hackle direction') throw new Error('no length');
  return reading;
}

describe('a mirror read from its origin', () => {
  const drawn = mirror({ x: 200, y: 500 }, { x: 500, y: 190 }, { x: 810, y: 500 });

  it('has the mean of its distances from the origin as radius', () => {
    // distances 300, 310, 310 px: mean 306.667 px, at 0.5 µm 0.15333 mm
    const reading = lengthOf(markReadings(drawn, scale, originAt({ x: 500, y: 500 })));
    expect(reading.valuePx).toBeCloseTo(306.6667, 4);
    expect(reading.valueMm).toBeCloseTo(0.1533333, 7);
    // s = 5.7735 px, s/√3 = 3.3333; both ends 0.40825; scale 0.4 % of 306.667 = 1.22667: together 3.57526 px
    expect(reading.standardUncertaintyMm).toBeCloseTo((3.57526 * 0.5) / 1000, 8);
  });

  it('is read along the tensile surface, left and right, where the origin is of a surface kind', () => {
    // 300 and 310 px: mean 305, half their difference is s/√2 = 5 px
    const reading = lengthOf(markReadings(drawn, scale, originAt({ x: 500, y: 500 }, 'MD')));
    expect(reading.valuePx).toBe(305);
    expect(reading.way).toBe('left and right along the surface');
    expect(reading.standardUncertaintyPx).toBeCloseTo(Math.hypot(5, Math.SQRT2 / 2 / Math.sqrt(3)), 9);
  });

  it('takes all directions of a surface origin whose mirror was drawn in part only', () => {
    const part = mirror({ x: 500, y: 200 }, { x: 800, y: 500 });
    expect(lengthOf(markReadings(part, scale, originAt({ x: 500, y: 500 }, 'MD'))).way).toBe('mean of 2 directions');
  });

  it('says nothing without an origin, rather than a radius about a guess', () => {
    expect(markReadings(drawn, scale, null)).toEqual([]);
  });
});

describe('an image without a scale', () => {
  it('yields no length, only pixels and the word uncalibrated', () => {
    const readings = markReadings(mirror({ x: 0, y: 0 }, { x: 0, y: 20 }), null, originAt({ x: 0, y: 10 }));
    expect(lengthOf(readings)).toMatchObject({ valuePx: 10, valueMm: null, standardUncertaintyMm: null });
    expect(readingText(readings[0])).toBe('R 10\u00a0px, uncalibrated');
  });
});

describe('pixels that are not square', () => {
  it('are taken apart in each direction', () => {
    const across = { shape: 'segment', from: { x: 0, y: 0 }, to: { x: 300, y: 400 } } as const;
    const reading = lengthOf(
      markReadings(
        { kind: 'length', geometry: across },
        { pixelSizeXUm: 1, pixelSizeYUm: 2, relativeUncertainty: 0 },
        null,
      ),
    );
    // 300 µm across, 800 µm down
    expect(reading.valueMm).toBeCloseTo(Math.hypot(0.3, 0.8), 12);
    expect(reading.valuePx).toBe(500);
  });
});

describe('a flaw', () => {
  const flaw = (turnDeg: number, points: PointPx[] = []) => ({
    kind: 'flaw outline' as const,
    geometry: {
      shape: 'ellipse',
      centre: { x: 500, y: 500 },
      halfAxisDepthPx: 60,
      halfAxisAlongPx: 100,
      turnDeg,
      flawShape: 'half-ellipse',
      place: 'surface',
      points,
    } satisfies MarkGeometry,
  });

  it('is read by its half-axes, in depth and along', () => {
    const readings = markReadings(flaw(0), scale, null);
    expect(readings.map(({ quantity }) => quantity)).toEqual(['flaw half-axis, depth', 'flaw half-axis, along']);
    expect(lengthOf(readings, 0).valueMm).toBeCloseTo(0.03, 12);
    expect(lengthOf(readings, 1).valueMm).toBeCloseTo(0.05, 12);
  });

  it('keeps its size when it is turned', () => {
    expect(lengthOf(markReadings(flaw(37), scale, null)).valueMm).toBeCloseTo(0.03, 12);
  });

  it('is the less certain the farther its points lie from the ellipse', () => {
    const on = markReadings(
      flaw(0, [
        { x: 400, y: 500 },
        { x: 500, y: 440 },
        { x: 600, y: 500 },
      ]),
      scale,
      null,
    );
    const off = markReadings(
      flaw(0, [
        { x: 400, y: 500 },
        { x: 500, y: 431 },
        { x: 600, y: 500 },
      ]),
      scale,
      null,
    );
    const [tight, wide] = [lengthOf(on), lengthOf(off)];
    // one of three points 9 px off: rms 9/√3, over √3: 3 px
    expect(wide.standardUncertaintyPx ** 2 - tight.standardUncertaintyPx ** 2).toBeCloseTo(9, 9);
  });
});

describe('lengths and directions', () => {
  it('says how deep the origin lies only where the length was drawn for that', () => {
    const down = { shape: 'segment', from: { x: 5, y: 0 }, to: { x: 5, y: 360 } } as const;
    const plain = markReadings({ kind: 'length', geometry: down }, scale, null);
    const depth = markReadings({ kind: 'length', geometry: { ...down, measures: 'depth of origin' } }, scale, null);
    expect([plain[0]?.quantity, depth[0]?.quantity]).toEqual(['length', 'depth of origin']);
    expect(readingText(depth[0])).toBe('origin at 180.0\u00a0±\u00a01.5\u00a0µm');
  });

  it('reads the run of hackle anticlockwise from the right, with or without a scale', () => {
    const to = (x: number, y: number) =>
      markReadings({ kind: 'hackle', geometry: { shape: 'segment', from: { x: 0, y: 0 }, to: { x, y } } }, null, null);
    expect(to(0, -10)).toEqual([{ quantity: 'hackle direction', directionDeg: 90 }]);
    expect(readingText(to(-10, -10)[0])).toBe('135°');
    expect(readingText(to(10, 0)[0])).toBe('0°');
  });
});
