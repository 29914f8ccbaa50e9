import type { PointPx } from '#shared/contracts/marks.ts';
import type { ScaleView } from '#shared/contracts/fractographs.ts';
import { originOf, type BenchState, type ShownMark } from './bench-state.ts';
import type { View } from './view.ts';

/** One face as the other is brought to it. */
export type FaceFacts = {
  readonly state: BenchState;
  readonly marks: readonly ShownMark[];
  readonly scale: ScaleView | null;
};

/** The place of the mating face that lies on a place of this one: mirrored about the origins, or the middles. */
export function matingPlace(place: PointPx, from: FaceFacts, to: FaceFacts): PointPx {
  const [here, there] = [middleOf(from), middleOf(to)];
  const ratio = pxRatio(from, to);
  return { x: there.x - (place.x - here.x) * ratio, y: there.y + (place.y - here.y) * ratio };
}

/** The view of the mating face in which features answer each other across the fold. */
export function matingView(from: FaceFacts, to: FaceFacts): View {
  return {
    ...to.state.view,
    centrePx: matingPlace(from.state.view.centrePx, from, to),
    screenPxPerImagePx: from.state.view.screenPxPerImagePx / pxRatio(from, to),
  };
}

function middleOf({ state, marks }: FaceFacts): PointPx {
  const origin = originOf(marks)?.geometry;
  if (origin?.shape === 'point') return origin.at;
  return { x: state.image.widthPx / 2, y: state.image.heightPx / 2 };
}

/** Px of the other image to one of this: by their scales where both have one, else by their widths. */
function pxRatio(from: FaceFacts, to: FaceFacts): number {
  if (from.scale && to.scale) return from.scale.pixelSizeXUm / to.scale.pixelSizeXUm;
  return to.state.image.widthPx / from.state.image.widthPx;
}
