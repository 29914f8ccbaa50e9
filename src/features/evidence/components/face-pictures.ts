import type { MatePairView } from '#shared/contracts/evidence.ts';
import type { Face } from '#shared/vocabulary/pieces.ts';

/** A fractograph of a face, as far as it can be shown beside its mate. */
export type FacePicture = {
  readonly fragmentId: string;
  readonly face: Face;
  readonly view: string | null;
  readonly figureNumber: number;
  readonly caption: string;
  /** Address of its preview. */
  readonly src: string;
};

/** One fractograph for each face of a pair: two of the same view where there are, else the first of each. */
export function facePictures(
  pair: Pick<MatePairView, 'one' | 'other'>,
  pictures: readonly FacePicture[],
): [FacePicture | null, FacePicture | null] {
  const of = ({ fragmentId, face }: MatePairView['one']) =>
    pictures
      .filter((picture) => picture.fragmentId === fragmentId && picture.face === face)
      .sort((one, other) => one.figureNumber - other.figureNumber);
  const [ones, others] = [of(pair.one), of(pair.other)];
  for (const one of ones) {
    const alike = others.find(({ view }) => view !== null && view === one.view);
    if (alike) return [one, alike];
  }
  return [ones[0] ?? null, others[0] ?? null];
}
