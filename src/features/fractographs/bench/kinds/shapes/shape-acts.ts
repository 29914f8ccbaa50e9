import type { MarkGeometry, PointPx } from '#shared/contracts/marks.ts';
import { chainActs } from './chain.ts';
import { ellipseActs } from './ellipse.ts';
import { pointActs } from './point.ts';
import { segmentActs } from './segment.ts';
import { lengthOf, minus, plus, times, type LabelPlace } from './shape.ts';

// One way in to the acts of every shape: what a geometry is decides which acts answer.

export function handlesOf(geometry: MarkGeometry): readonly PointPx[] {
  switch (geometry.shape) {
    case 'point':
      return pointActs.handles(geometry);
    case 'segment':
      return segmentActs.handles(geometry);
    case 'chain':
      return chainActs.handles(geometry);
    case 'ellipse':
      return ellipseActs.handles(geometry);
  }
}

export function withHandle(geometry: MarkGeometry, index: number, to: PointPx): MarkGeometry {
  switch (geometry.shape) {
    case 'point':
      return pointActs.withHandle(geometry, index, to);
    case 'segment':
      return segmentActs.withHandle(geometry, index, to);
    case 'chain':
      return chainActs.withHandle(geometry, index, to);
    case 'ellipse':
      return ellipseActs.withHandle(geometry, index, to);
  }
}

export function movedBy(geometry: MarkGeometry, by: PointPx): MarkGeometry {
  switch (geometry.shape) {
    case 'point':
      return pointActs.moved(geometry, by);
    case 'segment':
      return segmentActs.moved(geometry, by);
    case 'chain':
      return chainActs.moved(geometry, by);
    case 'ellipse':
      return ellipseActs.moved(geometry, by);
  }
}

export function outlineOf(geometry: MarkGeometry): readonly PointPx[] {
  switch (geometry.shape) {
    case 'point':
      return pointActs.outline(geometry);
    case 'segment':
      return segmentActs.outline(geometry);
    case 'chain':
      return chainActs.outline(geometry);
    case 'ellipse':
      return ellipseActs.outline(geometry);
  }
}

export function labelPlaceOf(geometry: MarkGeometry): LabelPlace {
  switch (geometry.shape) {
    case 'point':
      return pointActs.labelPlace(geometry);
    case 'segment':
      return segmentActs.labelPlace(geometry);
    case 'chain':
      return chainActs.labelPlace(geometry);
    case 'ellipse':
      return ellipseActs.labelPlace(geometry);
  }
}

/** How far a place is from what is drawn of a mark, image px. */
export function distanceToMarkPx(geometry: MarkGeometry, place: PointPx): number {
  const line = outlineOf(geometry);
  if (line.length === 1) return lengthOf(minus(place, line[0]));
  return Math.min(...line.slice(1).map((end, index) => distanceToSpan(line[index], end, place)));
}

function distanceToSpan(from: PointPx, to: PointPx, place: PointPx): number {
  const span = minus(to, from);
  const square = span.x ** 2 + span.y ** 2;
  const reach = minus(place, from);
  const share = square === 0 ? 0 : Math.min(1, Math.max(0, (reach.x * span.x + reach.y * span.y) / square));
  return lengthOf(minus(place, plus(from, times(span, share))));
}
