import type { MarkGeometry, MarkSent, PointPx } from '#shared/contracts/marks.ts';
import { createNoise } from '../../imaging/synthetic-surface/noise.ts';
import type { FractureSurfaceSpec } from '../../imaging/synthetic-surface/surface-spec.ts';
import { isOnFace, truthOf } from '../../imaging/synthetic-surface/surface-truth.ts';
import type { DemoReading } from './demo-case.ts';

const arcPoints = 9;
const mistPoints = 7;
const hackleRuns = 3;

type Marked = Omit<MarkSent, 'certainty'>;

/**
 * The marks a reader draws on a view, from what is known of the drawn surface: origin, flaw outline, mirror, mist and a
 * few hackle lines. A reader misled by a bystander marks that instead.
 */
export function marksOf(spec: FractureSurfaceSpec, reading: DemoReading): Marked[] {
  const truth = truthOf(createNoise(spec.seed), spec, null);
  const seen = reading.ofBystander ? bystanderOf(spec) : originOf(spec);
  const mirrorUm = reading.mirrorRadiusUm ?? spec.mirrorRadiusUm;
  const plain = { boundary: null, originCode: null, note: '' };
  const marks: Marked[] = [
    {
      ...plain,
      kind: 'origin',
      geometry: { shape: 'point', at: seen.at },
      originCode: reading.originCode,
      note: reading.note ?? '',
    },
  ];
  const outline = reading.ofBystander ? [] : (truth.flaw?.outline ?? []).map(({ xPx, yPx }) => rounded(xPx, yPx));
  marks.push({ ...plain, kind: 'flaw outline', geometry: ellipseOf(seen, reading, outline) });
  if (reading.boundary && mirrorUm !== null) {
    const points = arcOf(spec, seen.at, mirrorUm / spec.pixelSizeUm, arcPoints);
    const geometry = { shape: 'chain', points, centre: seen.at } as const;
    marks.push({ ...plain, kind: 'mirror', geometry, boundary: reading.boundary });
    // Where the outer edge is read, the mist lies inside it and is not marked again.
    const isInner = reading.boundary === 'inner';
    const mist = isInner && truth.mirror ? arcOf(spec, seen.at, truth.mirror.mistOuterRadiusPx, mistPoints) : [];
    if (mist.length > 1) marks.push({ ...plain, kind: 'mist', geometry: { shape: 'chain', points: mist } });
  }
  for (const { from, to } of truth.hackle.slice(0, reading.ofBystander ? 0 : hackleRuns))
    marks.push({
      ...plain,
      kind: 'hackle',
      geometry: { shape: 'segment', from: rounded(from.xPx, from.yPx), to: rounded(to.xPx, to.yPx) },
    });
  return marks;
}

type Seen = { readonly at: PointPx; readonly depthPx: number; readonly alongPx: number };

function originOf({ origin, flaw, pixelSizeUm }: FractureSurfaceSpec): Seen {
  if (!flaw) throw new Error('there is no origin on this face');
  const [depthPx, alongPx] = [flaw.halfAxisDepthUm / pixelSizeUm, flaw.halfAxisAlongUm / pixelSizeUm];
  return { at: { x: origin.xPx, y: origin.yPx }, depthPx, alongPx };
}

function bystanderOf({ origin, originDepthUm, bystanders, pixelSizeUm }: FractureSurfaceSpec): Seen {
  const [other] = bystanders ?? [];
  if (!other) throw new Error('nothing lies beside the origin of this face');
  const x = origin.xPx + other.alongUm / pixelSizeUm;
  const y = origin.yPx + (originDepthUm - other.depthUm) / pixelSizeUm;
  return { at: { x, y }, depthPx: other.halfAxisDepthUm / pixelSizeUm, alongPx: other.halfAxisAlongUm / pixelSizeUm };
}

function ellipseOf(seen: Seen, { flawShape, place }: DemoReading, points: PointPx[]): MarkGeometry {
  const axes = { halfAxisDepthPx: seen.depthPx, halfAxisAlongPx: seen.alongPx, turnDeg: 0 };
  return { shape: 'ellipse', centre: seen.at, ...axes, flawShape, place, points };
}

/** So many points, evenly over the longest part of the circle that lies on the face and in the image, left to right. */
function arcOf(spec: FractureSurfaceSpec, centre: PointPx, radiusPx: number, count: number): PointPx[] {
  const runs: number[][] = [[]];
  for (let degrees = 269; degrees > -91; degrees -= 1) {
    const { x: xPx, y: yPx } = pointAt(centre, radiusPx, degrees);
    if (isOnFace(spec, { xPx, yPx })) runs.at(-1)?.push(degrees);
    else runs.push([]);
  }
  const [longest] = runs.sort((one, other) => other.length - one.length);
  const [first, last] = [longest?.at(0), longest?.at(-1)];
  if (first === undefined || last === undefined || first === last) return [];
  return Array.from({ length: count }, (_, step) =>
    pointAt(centre, radiusPx, first + ((last - first) * step) / (count - 1)),
  );
}

function pointAt(centre: PointPx, radiusPx: number, degrees: number): PointPx {
  const angle = (degrees * Math.PI) / 180;
  return { x: centre.x + radiusPx * Math.cos(angle), y: centre.y - radiusPx * Math.sin(angle) };
}

function rounded(x: number, y: number): PointPx {
  return { x: Math.round(x * 10) / 10, y: Math.round(y * 10) / 10 };
}
