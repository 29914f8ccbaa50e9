import type { MarkView, PointPx } from '#shared/contracts/marks.ts';
import { markKindTable, type MarkKindRow } from '#shared/vocabulary/mark-kinds.ts';
import { kindTable } from '../bench/kinds/kind-table.ts';
import { handlesOf, labelPlaceOf, outlineOf } from '../bench/kinds/shapes/shape-acts.ts';
import { DrawnEnds } from './drawn-ends.tsx';

type DrawnMarkProps = {
  mark: MarkView;
  /** From image px to px of screen in the drawing. */
  toScreen: (point: PointPx) => PointPx;
  /** Labels say only the number where there are many. */
  isCrowded: boolean;
};

const haloScreenPx = 2.6;
const labelAwayScreenPx = 15;

/** One mark as a drawing that is only looked at: halo, stroke, ends and label, the same as on the bench. */
export function DrawnMark({ mark, toScreen, isCrowded }: DrawnMarkProps) {
  const row: MarkKindRow = markKindTable[mark.kind];
  const line = outlineOf(mark.geometry).map(toScreen);
  const handles = handlesOf(mark.geometry).map(toScreen);
  const through = mark.geometry.shape === 'ellipse' ? mark.geometry.points.map(toScreen) : handles;
  const ink = `var(${row.colour})`;
  const words = isCrowded ? '' : kindTable[mark.kind].labelWords(mark, null);
  return (
    <g fill="none">
      {line.length > 1 ? <Stroke line={line} row={row} ink={ink} /> : null}
      <DrawnEnds
        ends={row.ends}
        line={line}
        points={through.length > 0 ? through : handles}
        ink={ink}
        words={String(mark.number)}
      />
      <Label
        place={labelPlaceOf(mark.geometry)}
        toScreen={toScreen}
        words={`m${mark.number} ${words}`.trim()}
        ink={ink}
      />
    </g>
  );
}

function Stroke({ line, row, ink }: { line: readonly PointPx[]; row: MarkKindRow; ink: string }) {
  const path = `M${line.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}`;
  const dash = row.dash.length > 0 ? row.dash.join(' ') : undefined;
  const isDotted = row.dash[0] !== undefined && row.dash[0] < 1;
  return (
    <>
      <path
        d={path}
        stroke="var(--m-halo)"
        opacity="0.72"
        strokeWidth={row.widthScreenPx + haloScreenPx}
        strokeLinecap="round"
        strokeDasharray={isDotted ? dash : undefined}
      />
      {row.casedScreenPx ? <path d={path} stroke="#fff" strokeWidth={row.casedScreenPx} /> : null}
      <path
        d={path}
        stroke={ink}
        strokeWidth={row.widthScreenPx}
        strokeDasharray={dash}
        strokeLinecap={isDotted ? 'round' : 'butt'}
      />
    </>
  );
}

type LabelProps = {
  place: { readonly at: PointPx; readonly outward: PointPx };
  toScreen: (point: PointPx) => PointPx;
  words: string;
  ink: string;
};

function Label({ place, toScreen, words, ink }: LabelProps) {
  const at = toScreen(place.at);
  const { outward } = place;
  return (
    <text
      x={at.x + outward.x * labelAwayScreenPx}
      y={at.y + outward.y * labelAwayScreenPx + 4.5}
      textAnchor={outward.x > 0.4 ? 'start' : outward.x < -0.4 ? 'end' : 'middle'}
      fontSize="13"
      fontWeight="600"
      fill={ink}
      stroke="var(--m-halo)"
      strokeWidth="3.2"
      strokeOpacity="0.8"
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {words}
    </text>
  );
}
