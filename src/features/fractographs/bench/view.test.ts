import { describe, expect, it } from 'vitest';
import { fitView, panned, seenRectPx, toImage, toScreen, zoomedAbout } from './view.ts';

const image = { widthPx: 4000, heightPx: 3000 };
const stage = { widthScreenPx: 800, heightScreenPx: 600 };

describe('the view of a fractograph', () => {
  it('shows the whole image when it is fitted', () => {
    expect(seenRectPx(fitView(image, stage), stage)).toEqual({ x: 0, y: 0, width: 4000, height: 3000 });
  });

  it('keeps the place under the pointer while coming closer', () => {
    const about = { x: 613, y: 77 };
    const before = toImage(fitView(image, stage), stage, about);
    const closer = zoomedAbout(fitView(image, stage), stage, image, about, 3.7);
    const after = toImage(closer, stage, about);
    expect(after.x).toBeCloseTo(before.x, 9);
    expect(after.y).toBeCloseTo(before.y, 9);
  });

  it('comes as close as single pixels and no closer', () => {
    const closest = zoomedAbout(fitView(image, stage), stage, image, { x: 400, y: 300 }, 1e9);
    expect(closest.screenPxPerImagePx).toBe(48);
  });

  it('turns a mating face over left to right only', () => {
    const turned = fitView(image, stage, true);
    expect(toScreen(turned, stage, { x: 0, y: 0 })).toEqual({ x: 800, y: 0 });
    expect(toImage(turned, stage, { x: 800, y: 0 })).toEqual({ x: 0, y: 0 });
  });

  it('pulls the image along with the hand, turned over or not', () => {
    for (const turnedOver of [false, true]) {
      const view = fitView(image, stage, turnedOver);
      const place = { x: 1500, y: 1500 };
      const before = toScreen(view, stage, place);
      const after = toScreen(panned(view, image, { x: 40, y: -20 }), stage, place);
      expect(after.x - before.x).toBeCloseTo(40, 9);
      expect(after.y - before.y).toBeCloseTo(-20, 9);
    }
  });

  it('keeps the middle of the stage on the image', () => {
    expect(panned(fitView(image, stage), image, { x: 1e6, y: 1e6 }).centrePx).toEqual({ x: 0, y: 0 });
  });
});
