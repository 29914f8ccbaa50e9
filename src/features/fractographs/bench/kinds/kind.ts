import type { MarkDrawn, MarkGeometry, PointPx } from '#shared/contracts/marks.ts';
import type { Certainty } from '#shared/vocabulary/certainties.ts';
import type { MirrorBoundary } from '#shared/vocabulary/mirror-boundaries.ts';
import type { OriginCode } from '#shared/vocabulary/origin-codes.ts';

/** What the next mark is drawn as; kept from one to the next. */
export type DrawAs = {
  readonly certainty: Certainty;
  readonly boundary: MirrorBoundary;
  readonly originCode: OriginCode;
  readonly measures: 'length' | 'depth of origin';
};

export type Points = {
  readonly points: readonly PointPx[];
  /** Whether the last point was set on the first: the outline closes upon itself. */
  readonly closed: boolean;
  /** The origin mark of the image, where there is one. */
  readonly origin: PointPx | null;
  readonly as: DrawAs;
};

/** What one kind of mark decides for itself; shape, stroke, word and key stand in the vocabulary's table. */
export type MarkKindDrawing = {
  /** Drawing ends by itself at so many points; null: a second setting of the last point ends it. */
  readonly finishesAt: number | null;
  /** @returns null where the points do not make such a mark yet */
  geometryFrom(points: Points): MarkGeometry | null;
  /** What of the choices the mark carries. */
  carries(as: DrawAs): Pick<MarkDrawn, 'boundary' | 'originCode'>;
  /** What the label says after the number; `reading` is the mark's first reading in words. */
  labelWords(mark: Pick<MarkDrawn, 'boundary' | 'originCode' | 'note'>, reading: string | null): string;
  /** What pressing the key again turns to. */
  again?(as: DrawAs): Partial<DrawAs>;
  /** The choice in words, beside the tool while it is picked. */
  chosenWords?(as: DrawAs): string;
};

export const carriesNothing = () => ({ boundary: null, originCode: null });

/** A chain from what was set, with the origin it is read from. */
export function chainFrom({ points, origin }: Points): MarkGeometry | null {
  if (points.length < 2) return null;
  return { shape: 'chain', points: [...points], ...(origin ? { centre: origin } : {}) };
}
