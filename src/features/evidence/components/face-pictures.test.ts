import { describe, expect, it } from 'vitest';
import { facePictures, type FacePicture } from './face-pictures.ts';

const pair = {
  one: { fragmentId: 'f1', code: 'F1', face: 'A' },
  other: { fragmentId: 'f2', code: 'F2', face: 'B' },
} as const;
const figure = (figureNumber: number, fragmentId: string, face: 'A' | 'B', view: string | null): FacePicture => ({
  fragmentId,
  face,
  view,
  figureNumber,
  caption: '',
  src: '',
});
const numbers = (...pictures: FacePicture[]) =>
  facePictures(pair, pictures).map((picture) => picture?.figureNumber ?? null);

describe('the fractographs of a pair of mating faces', () => {
  it('are two of the same view where there are', () => {
    expect(
      numbers(
        figure(1, 'f1', 'A', 'face'),
        figure(2, 'f1', 'A', 'origin'),
        figure(3, 'f2', 'B', 'detail'),
        figure(4, 'f2', 'B', 'origin'),
      ),
    ).toEqual([2, 4]);
  });
  it('are the first of each where no view is shared', () => {
    expect(numbers(figure(1, 'f1', 'A', null), figure(2, 'f2', 'B', null))).toEqual([1, 2]);
  });
  it('leave the place of a face empty that has none', () => {
    expect(numbers(figure(1, 'f1', 'A', 'face'), figure(2, 'f2', 'A', 'face'))).toEqual([1, null]);
  });
});
