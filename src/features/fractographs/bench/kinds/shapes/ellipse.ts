import type { PointPx } from '#shared/contracts/marks.ts';
import { directionOf, lengthOf, minus, plus, times, type GeometryOf, type ShapeActs } from './shape.ts';

type Ellipse = GeometryOf<'ellipse'>;
const smallestHalfAxisPx = 0.5;
const steps = 64;

/** Unit vectors of an ellipse: into the section, and along the surface. */
export function axesOf({ turnDeg }: Pick<Ellipse, 'turnDeg'>): { depth: PointPx; along: PointPx } {
  const turn = (turnDeg * Math.PI) / 180;
  return {
    depth: { x: Math.sin(turn), y: -Math.cos(turn) },
    along: { x: Math.cos(turn), y: Math.sin(turn) },
  };
}

const dot = (one: PointPx, other: PointPx) => one.x * other.x + one.y * other.y;

/** Handles: the end of the depth axis, then both ends along; a closed ellipse has the other end of the depth too. */
function axisEnds(ellipse: Ellipse): PointPx[] {
  const { depth, along } = axesOf(ellipse);
  const { centre, halfAxisDepthPx: a, halfAxisAlongPx: c } = ellipse;
  const ends = [plus(centre, times(depth, a)), plus(centre, times(along, c)), plus(centre, times(along, -c))];
  return isClosed(ellipse) ? [...ends, plus(centre, times(depth, -a))] : ends;
}

const isClosed = ({ flawShape }: Ellipse) => flawShape === 'ellipse' || flawShape === 'irregular';

export const ellipseActs: ShapeActs<'ellipse'> = {
  handles: axisEnds,
  withHandle: (ellipse, index, to) => {
    const { depth, along } = axesOf(ellipse);
    const reach = minus(to, ellipse.centre);
    const isDepth = index === 0 || index === 3;
    const size = Math.max(smallestHalfAxisPx, Math.abs(dot(reach, isDepth ? depth : along)));
    // pulled by a handle, it no longer is the ellipse through the drawn points
    return { ...ellipse, points: [], ...(isDepth ? { halfAxisDepthPx: size } : { halfAxisAlongPx: size }) };
  },
  moved: (ellipse, by) => ({
    ...ellipse,
    centre: plus(ellipse.centre, by),
    points: ellipse.points.map((point) => plus(point, by)),
  }),
  outline: (ellipse) => {
    const { depth, along } = axesOf(ellipse);
    const { from, to } = sweep(ellipse);
    return Array.from({ length: steps + 1 }, (_, step) => {
      const angle = from + ((to - from) * step) / steps;
      const outward = times(along, ellipse.halfAxisAlongPx * Math.cos(angle));
      return plus(plus(ellipse.centre, outward), times(depth, ellipse.halfAxisDepthPx * Math.sin(angle)));
    });
  },
  labelPlace: (ellipse) => {
    const { depth, along } = axesOf(ellipse);
    const toward = plus(times(depth, ellipse.halfAxisDepthPx), times(along, ellipse.halfAxisAlongPx));
    return { at: plus(ellipse.centre, times(toward, Math.SQRT1_2)), outward: directionOf(toward) };
  },
};

/** From and to, radians from the along axis towards the depth axis. */
function sweep(ellipse: Ellipse): { from: number; to: number } {
  if (isClosed(ellipse)) return { from: 0, to: 2 * Math.PI };
  return ellipse.flawShape === 'half-ellipse' ? { from: Math.PI, to: 0 } : { from: Math.PI / 2, to: 0 };
}

/**
 * The ellipse that a drawn outline stands for. An outline closed upon itself lies inside: upright axes, closest in the
 * least squares of its equation. An open one stands on the surface: its ends give the surface, the rest its depth.
 * @returns null for points that no ellipse fits
 */
export function ellipseThrough(points: readonly PointPx[], isOutlineClosed: boolean): Ellipse | null {
  if (points.length < 3) return null;
  return isOutlineClosed ? closedEllipse(points) : halfEllipse(points);
}

function halfEllipse(points: readonly PointPx[]): Ellipse | null {
  const [first, last] = [points[0], points[points.length - 1]];
  const chord = minus(last, first);
  const halfAxisAlongPx = lengthOf(chord) / 2;
  if (halfAxisAlongPx < smallestHalfAxisPx) return null;
  const centre = plus(first, times(chord, 0.5));
  const along = directionOf(chord);
  const across = { x: along.y, y: -along.x };
  const inner = points.slice(1, -1).map((point) => minus(point, centre));
  const side = Math.sign(inner.reduce((sum, point) => sum + dot(point, across), 0)) || 1;
  // (u / c)² + (v / a)² = 1 with c known: least squares of v² = a² (1 - (u / c)²)
  const terms = inner.map((point) => ({
    v2: dot(point, across) ** 2,
    w: Math.max(0, 1 - (dot(point, along) / halfAxisAlongPx) ** 2),
  }));
  const weight = terms.reduce((sum, { w }) => sum + w * w, 0);
  const depth2 = weight === 0 ? 0 : terms.reduce((sum, { v2, w }) => sum + v2 * w, 0) / weight;
  const halfAxisDepthPx = Math.sqrt(depth2);
  if (halfAxisDepthPx < smallestHalfAxisPx) return null;
  const depth = times(across, side);
  const turnDeg = (Math.atan2(depth.x, -depth.y) * 180) / Math.PI;
  return {
    shape: 'ellipse',
    centre,
    halfAxisDepthPx,
    halfAxisAlongPx,
    turnDeg,
    flawShape: 'half-ellipse',
    place: 'surface',
    points: [...points],
  };
}

/** About the middle of its box, so that an outline drawn unevenly keeps its place. */
function closedEllipse(points: readonly PointPx[]): Ellipse | null {
  const xs = points.map(({ x }) => x);
  const ys = points.map(({ y }) => y);
  const centre = { x: (Math.min(...xs) + Math.max(...xs)) / 2, y: (Math.min(...ys) + Math.max(...ys)) / 2 };
  const fitted = uprightHalfAxes(points.map((point) => minus(point, centre)));
  const boxed = { along: (Math.max(...xs) - Math.min(...xs)) / 2, depth: (Math.max(...ys) - Math.min(...ys)) / 2 };
  const { along, depth } = fitted ?? boxed;
  if (Math.min(along, depth) < smallestHalfAxisPx) return null;
  return {
    shape: 'ellipse',
    centre,
    halfAxisDepthPx: depth,
    halfAxisAlongPx: along,
    turnDeg: 0,
    flawShape: 'ellipse',
    place: 'interior',
    points: [...points],
  };
}

/** Least squares of u² / c² + v² / a² = 1; null where the points lie on no upright ellipse about their middle. */
function uprightHalfAxes(points: readonly PointPx[]): { along: number; depth: number } | null {
  const sum = (term: (u2: number, v2: number) => number) =>
    points.reduce((total, { x, y }) => total + term(x * x, y * y), 0);
  const [uu, uv, vv] = [sum((u) => u * u), sum((u, v) => u * v), sum((_, v) => v * v)];
  const [u, v] = [sum((u2) => u2), sum((_, v2) => v2)];
  const determinant = uu * vv - uv * uv;
  // less than a part in a million is rounding: the points do not fix two half-axes
  if (determinant <= 1e-6 * uu * vv) return null;
  const [p, q] = [(u * vv - v * uv) / determinant, (uu * v - uv * u) / determinant];
  return p > 0 && q > 0 ? { along: 1 / Math.sqrt(p), depth: 1 / Math.sqrt(q) } : null;
}
