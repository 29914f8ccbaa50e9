import { describe, expect, it } from 'vitest';
import { rulerTicks, scaleBarOf } from './ruler-ticks.ts';

const view = { centrePx: { x: 500, y: 400 }, screenPxPerImagePx: 1, turnedOver: false };
const stage = { widthScreenPx: 1000, heightScreenPx: 800 };
const scale = { pixelSizeXUm: 2, pixelSizeYUm: 2, relativeUncertainty: 0.01 };

describe('the ruler along the foot of a face', () => {
  it('has its zero at the origin and counts both ways from it', () => {
    const ticks = rulerTicks({ view, stage, scale }, { xPx: 300, name: ', m1' });
    expect(ticks.find(({ isZero }) => isZero)).toMatchObject({ xScreenPx: 300, label: '0\u00a0µm, m1' });
    const labelled = ticks.filter(({ label }) => label === '200').map(({ xScreenPx }) => xScreenPx);
    expect(labelled).toEqual([200, 400]);
  });

  it('counts pixels while the image is uncalibrated', () => {
    const ticks = rulerTicks({ view, stage, scale: null }, { xPx: 0, name: '' });
    expect(ticks.find(({ isZero }) => isZero)?.label).toBe('0\u00a0px');
  });

  it('keeps its true lengths on a face turned over', () => {
    const ticks = rulerTicks({ view: { ...view, turnedOver: true }, stage, scale }, { xPx: 300, name: '' });
    const hundred = ticks.filter(({ label }) => label === '200').map(({ xScreenPx }) => xScreenPx);
    expect(hundred.sort()).toEqual([600, 800]);
  });
});

describe('the scale bar', () => {
  it('is of a round length and says when there is no scale', () => {
    expect(scaleBarOf(view, scale, 150)).toEqual({ widthScreenPx: 100, words: '200\u00a0µm' });
    expect(scaleBarOf(view, null, 150).words).toBe('100\u00a0px, uncalibrated');
  });
});
