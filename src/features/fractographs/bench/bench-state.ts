import type { MarkGeometry, MarkView, PointPx } from '#shared/contracts/marks.ts';
import type { MarkKind } from '#shared/vocabulary/mark-kinds.ts';
import type { DrawAs } from './kinds/kind.ts';
import type { ImageSize, StageSize, View } from './view.ts';

/** A mark as the bench shows it: one not kept yet has no number. */
export type ShownMark = Omit<MarkView, 'number'> & { readonly number: number | null; readonly waiting: boolean };

/** What the hand holds: nothing, a mark to draw, or the line along a scale bar. */
export type Tool = MarkKind | 'scale bar' | null;

export type Light = {
  /** Added, −100 to 100; 0 leaves the image as it came. */
  readonly brightness: number;
  /** Times, 0.2 to 4; 1 leaves the image as it came. */
  readonly contrast: number;
  readonly inverted: boolean;
};

/** A mark being pulled: a handle by its index, or the whole by null. */
export type Grip = {
  readonly markId: string;
  readonly handle: number | null;
  readonly from: PointPx;
  readonly before: MarkGeometry;
  readonly now: MarkGeometry;
};

/** All that the bench is, as plain data in image px. */
export type BenchState = {
  readonly image: ImageSize;
  readonly stage: StageSize;
  readonly view: View;
  /** The view follows the stage's size until one comes closer or pulls the image. */
  readonly fitted: boolean;
  readonly tool: Tool;
  readonly as: DrawAs;
  /** Points set so far of the mark under way. */
  readonly points: readonly PointPx[];
  /** Where the next point would be set. */
  readonly reticle: PointPx;
  readonly selectedId: string | null;
  readonly grip: Grip | null;
  readonly hiddenIds: readonly string[];
  readonly light: Light;
  /** Marks here can be looked at and not moved. */
  readonly fixed: boolean;
};

export const plainLight: Light = { brightness: 0, contrast: 1, inverted: false };

// Until the stage has been measured.
const firstStage: StageSize = { widthScreenPx: 890, heightScreenPx: 598 };

export function benchState(image: ImageSize, options: { turnedOver?: boolean; fixed?: boolean } = {}): BenchState {
  const scale = Math.min(firstStage.widthScreenPx / image.widthPx, firstStage.heightScreenPx / image.heightPx);
  const centrePx = { x: image.widthPx / 2, y: image.heightPx / 2 };
  return {
    image,
    stage: firstStage,
    view: { centrePx, screenPxPerImagePx: scale, turnedOver: options.turnedOver ?? false },
    fitted: true,
    tool: null,
    as: { certainty: 'certain', boundary: 'outer', originCode: '?', measures: 'length' },
    points: [],
    reticle: centrePx,
    selectedId: null,
    grip: null,
    hiddenIds: [],
    light: plainLight,
    fixed: options.fixed ?? false,
  };
}

/** The origin of the image: the first drawn that still stands. */
export function originOf(marks: readonly ShownMark[]): ShownMark | null {
  const origins = marks.filter((mark) => mark.kind === 'origin' && !mark.removed);
  return origins.reduce<ShownMark | null>(
    (first, mark) => (first && orderOf(first) <= orderOf(mark) ? first : mark),
    null,
  );
}

const orderOf = (mark: ShownMark) => mark.number ?? Infinity;
