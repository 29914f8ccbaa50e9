import type { MarkGeometry, PointPx } from '#shared/contracts/marks.ts';
import { markKindTable, type MarkKind } from '#shared/vocabulary/mark-kinds.ts';
import { Problem } from '../../../http/problem.ts';

type Image = { readonly figureNumber: number; readonly widthPx: number | null; readonly heightPx: number | null };

/**
 * Checks that a mark is of its kind's shape and lies on its image.
 * @throws Problem not-valid naming the field; not-ready while the image's size is not known yet
 */
export function checkMark(kind: MarkKind, geometry: MarkGeometry, image: Image): void {
  const row = markKindTable[kind];
  if (geometry.shape !== row.shape) {
    throw new Problem('not-valid', `${row.word} is drawn as a ${row.shape}, not as a ${geometry.shape}.`, {
      field: 'geometry',
    });
  }
  if (image.widthPx === null || image.heightPx === null) {
    throw new Problem(
      'not-ready',
      `Fig. ${image.figureNumber} has not been read yet; mark it when its image is there.`,
    );
  }
  if (hasNoLength(geometry)) {
    throw new Problem('not-valid', `${row.word} needs two points apart.`, { field: 'geometry' });
  }
  const { widthPx, heightPx } = image;
  const outside = pointsOf(geometry).find(({ x, y }) => x < 0 || y < 0 || x > widthPx || y > heightPx);
  if (outside) {
    throw new Problem(
      'not-valid',
      `A point at ${Math.round(outside.x)}, ${Math.round(outside.y)} px lies beside the image, which is ${widthPx} by ${heightPx} px.`,
      { field: 'geometry' },
    );
  }
}

/** The points that must lie on the image. An outline's ellipse may reach past its edge, its centre may not. */
function pointsOf(geometry: MarkGeometry): readonly PointPx[] {
  switch (geometry.shape) {
    case 'point':
      return [geometry.at];
    case 'segment':
      return [geometry.from, geometry.to];
    case 'chain':
      return geometry.points;
    case 'ellipse':
      return [geometry.centre, ...geometry.points];
  }
}

function hasNoLength(geometry: MarkGeometry): boolean {
  if (geometry.shape === 'point' || geometry.shape === 'ellipse') return false;
  const [first, ...others] = pointsOf(geometry);
  return others.every((point) => point.x === first.x && point.y === first.y);
}
