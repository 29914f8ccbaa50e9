import { describe, expect, it } from 'vitest';
import { benchState } from './bench-state.ts';
import { matingPlace, matingView, type FaceFacts } from './together.ts';
import { toScreen } from './view.ts';

const image = { widthPx: 2000, heightPx: 1000 };
const first: FaceFacts = { state: benchState(image), marks: [], scale: null };
const mate: FaceFacts = { state: benchState(image, { turnedOver: true }), marks: [], scale: null };

describe('mating faces looked at together', () => {
  it('answer each other mirrored left to right, there and back', () => {
    const there = matingPlace({ x: 1300, y: 400 }, first, mate);
    expect(there).toEqual({ x: 700, y: 400 });
    expect(matingPlace(there, mate, first)).toEqual({ x: 1300, y: 400 });
  });

  it('show the same feature at the same place of their stages', () => {
    const view = matingView(first, mate);
    const place = { x: 1300, y: 400 };
    const here = toScreen(first.state.view, first.state.stage, place);
    expect(toScreen(view, mate.state.stage, matingPlace(place, first, mate))).toEqual(here);
  });
});
