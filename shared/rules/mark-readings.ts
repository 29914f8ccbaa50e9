import type { MarkGeometry, MarkView } from '../contracts/marks.ts';
import type { ScaleView } from '../contracts/fractographs.ts';
import { angleBetweenDeg } from '../numeric/imaging/angle-between.ts';
import type { PointPx } from '../numeric/imaging/distance.ts';
import type { MeasuredQuantity } from '../vocabulary/measured-quantities.ts';
import { originCodeTable } from '../vocabulary/origin-codes.ts';

/** What of an image's scale a reading needs. */
export type ReadingScale = Pick<ScaleView, 'pixelSizeXUm' | 'pixelSizeYUm' | 'relativeUncertainty'>;

export type ReadMark = Pick<MarkView, 'kind' | 'geometry'>;
export type OriginMark = Pick<MarkView, 'geometry' | 'originCode'>;

/** A length in px, and in mm where the image has a scale. Without one both mm fields are null: uncalibrated. */
export type LengthReading = {
  readonly quantity: MeasuredQuantity;
  /** How it was read: "mean of 7 directions". */
  readonly way: string;
  readonly valuePx: number;
  readonly standardUncertaintyPx: number;
  readonly valueMm: number | null;
  readonly standardUncertaintyMm: number | null;
};

/** A direction on the image, degrees anticlockwise from the right, 0 ≤ angle < 360; it needs no scale. */
export type DirectionReading = { readonly quantity: 'hackle direction'; readonly directionDeg: number };
export type MarkReading = LengthReading | DirectionReading;

// A point falls anywhere within half a pixel of where it was set: rectangular, both ends of a length, not lessened by
// repeats, since a hand tends to set it the same way.
const endsPx = (Math.SQRT2 * 0.5) / Math.sqrt(3);
// Ends of a mirror nearer to a half turn than this lie along the tensile surface.
const leastSurfaceSpreadDeg = 150;
const umPerMm = 1000;

/**
 * What a mark says as numbers: mirror radius, half-axes of a flaw, a length, the depth of the origin, or a direction.
 * A mirror is read from the origin mark, else from the centre kept in it, else not at all. With a surface origin whose
 * mirror was drawn from end to end, the radius is that along the tensile surface, (left + right) / 2.
 */
export function markReadings(
  mark: ReadMark,
  scale: ReadingScale | null,
  origin: OriginMark | null,
): readonly MarkReading[] {
  const { geometry } = mark;
  if (mark.kind === 'mirror' && geometry.shape === 'chain') return mirrorReadings(geometry, scale, origin);
  if (mark.kind === 'flaw outline' && geometry.shape === 'ellipse') return flawReadings(geometry, scale);
  if (mark.kind === 'hackle' && geometry.shape === 'segment') return [directionReading(geometry)];
  if (mark.kind === 'length' && geometry.shape === 'segment') {
    const quantity = geometry.measures ?? 'length';
    return [lengthReading(quantity, 'between its ends', [spanOf(geometry.from, geometry.to)], scale)];
  }
  return [];
}

/** The place radii are read from: the origin mark of the image, where there is one. */
export function centreOf(origin: OriginMark | null): PointPx | null {
  return origin?.geometry.shape === 'point' ? origin.geometry.at : null;
}

type Chain = Extract<MarkGeometry, { shape: 'chain' }>;
type Ellipse = Extract<MarkGeometry, { shape: 'ellipse' }>;
type Segment = Extract<MarkGeometry, { shape: 'segment' }>;
type Span = { readonly x: number; readonly y: number };

const spanOf = (from: PointPx, to: PointPx): Span => ({ x: to.x - from.x, y: to.y - from.y });

function mirrorReadings(chain: Chain, scale: ReadingScale | null, origin: OriginMark | null): MarkReading[] {
  const centre = centreOf(origin) ?? chain.centre ?? null;
  if (!centre) return [];
  const ends = surfaceEnds(chain, centre, origin);
  const points = ends ?? chain.points;
  const way = ends ? 'left and right along the surface' : `mean of ${points.length} directions`;
  return [
    lengthReading(
      'mirror radius',
      way,
      points.map((point) => spanOf(centre, point)),
      scale,
    ),
  ];
}

/** First and last point where the origin is of a surface kind and they lie either side of it; else null. */
function surfaceEnds(chain: Chain, centre: PointPx, origin: OriginMark | null): readonly PointPx[] | null {
  const code = origin?.originCode;
  const [first, last] = [chain.points[0], chain.points.at(-1)];
  if (!code || originCodeTable[code].distribution !== 'surface' || !first || !last) return null;
  if (isAt(first, centre) || isAt(last, centre)) return null;
  return angleBetweenDeg(centre, first, last) >= leastSurfaceSpreadDeg ? [first, last] : null;
}

const isAt = (one: PointPx, other: PointPx) => one.x === other.x && one.y === other.y;

function flawReadings(ellipse: Ellipse, scale: ReadingScale | null): MarkReading[] {
  const turn = (ellipse.turnDeg * Math.PI) / 180;
  const { halfAxisDepthPx: depth, halfAxisAlongPx: along, points } = ellipse;
  const way = points.length > 0 ? `ellipse through ${points.length} points` : 'ellipse as entered';
  const scatterPx = outlineScatterPx(ellipse);
  return [
    lengthReading(
      'flaw half-axis, depth',
      way,
      [{ x: depth * Math.sin(turn), y: -depth * Math.cos(turn) }],
      scale,
      scatterPx,
    ),
    lengthReading(
      'flaw half-axis, along',
      way,
      [{ x: along * Math.cos(turn), y: along * Math.sin(turn) }],
      scale,
      scatterPx,
    ),
  ];
}

/** Root mean square distance of the drawn points from the ellipse, along their own radius, over √n, px. */
function outlineScatterPx(ellipse: Ellipse): number {
  const turn = (ellipse.turnDeg * Math.PI) / 180;
  const count = ellipse.points.length;
  if (count === 0) return 0;
  const squares = ellipse.points.map((point) => {
    const { x, y } = spanOf(ellipse.centre, point);
    const depth = x * Math.sin(turn) - y * Math.cos(turn);
    const along = x * Math.cos(turn) + y * Math.sin(turn);
    const reach = Math.hypot(depth / ellipse.halfAxisDepthPx, along / ellipse.halfAxisAlongPx);
    return reach === 0 ? 0 : (Math.hypot(depth, along) * (1 - 1 / reach)) ** 2;
  });
  return Math.sqrt(squares.reduce((sum, square) => sum + square, 0) / count / count);
}

function directionReading(segment: Segment): DirectionReading {
  const { x, y } = spanOf(segment.from, segment.to);
  const angle = (Math.atan2(-y, x) * 180) / Math.PI;
  return { quantity: 'hackle direction', directionDeg: (angle + 360) % 360 };
}

/** Mean length of spans. Scatter (s/√n), the setting of the ends and the scale are independent parts of u. */
function lengthReading(
  quantity: MeasuredQuantity,
  way: string,
  spans: readonly Span[],
  scale: ReadingScale | null,
  scatterPx = 0,
): LengthReading {
  const px = meanOf(spans.map(({ x, y }) => Math.hypot(x, y)));
  const standardUncertaintyPx = Math.hypot(px.standardUncertainty, scatterPx, endsPx);
  const read = { quantity, way, valuePx: px.mean, standardUncertaintyPx };
  if (!scale || px.mean === 0) return { ...read, valueMm: null, standardUncertaintyMm: null };
  const { pixelSizeXUm, pixelSizeYUm, relativeUncertainty } = scale;
  const mm = meanOf(spans.map(({ x, y }) => Math.hypot(x * pixelSizeXUm, y * pixelSizeYUm) / umPerMm));
  const mmPerPx = mm.mean / px.mean;
  const standardUncertaintyMm = Math.hypot(
    mm.standardUncertainty,
    scatterPx * mmPerPx,
    endsPx * mmPerPx,
    mm.mean * relativeUncertainty,
  );
  return { ...read, valueMm: mm.mean, standardUncertaintyMm };
}

function meanOf(values: readonly number[]): { mean: number; standardUncertainty: number } {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  if (values.length < 2) return { mean, standardUncertainty: 0 };
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  return { mean, standardUncertainty: Math.sqrt(squares / (values.length - 1) / values.length) };
}
