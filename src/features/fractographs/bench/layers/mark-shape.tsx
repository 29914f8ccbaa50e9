import { Circle, Group, Line, Text } from 'react-konva';
import type { BenchState, ShownMark } from '../bench-state.ts';
import { handlesOf, labelPlaceOf, outlineOf } from '../kinds/shapes/shape-acts.ts';
import { haloInk, paintOf, type Paint } from '../mark-paint.ts';
import { nameOf } from '../readout.ts';
import { toScreen, type PointScreenPx } from '../view.ts';
import { MarkEnds } from './mark-ends.tsx';

const labelAwayScreenPx = 15;
const halo = 2.6;

type MarkShapeProps = { mark: ShownMark; state: BenchState; isSelected: boolean; label: string };

/** One mark: halo, glow and handles when selected, stroke, ends and label; all of one size on the screen at every zoom. */
export function MarkShape({ mark, state, isSelected, label }: MarkShapeProps) {
  const { view, stage } = state;
  const onStage = (points: readonly { x: number; y: number }[]) => points.map((point) => toScreen(view, stage, point));
  const paint = paintOf(mark, isSelected);
  const line = onStage(outlineOf(mark.geometry));
  const handles = onStage(handlesOf(mark.geometry));
  const drawnThrough = mark.geometry.shape === 'ellipse' ? onStage(mark.geometry.points) : handles;
  const place = labelPlaceOf(mark.geometry);
  return (
    <Group id={mark.number === null ? mark.id : `m${mark.number}`} name="mark" listening={false}>
      {line.length > 1 ? <Stroke line={line} paint={paint} isSelected={isSelected} /> : null}
      <Group opacity={paint.strength}>
        <MarkEnds
          ends={paint.row.ends}
          line={line}
          points={drawnThrough.length > 0 ? drawnThrough : handles}
          ink={paint.ink}
          words={mark.number === null ? '' : String(mark.number)}
        />
      </Group>
      {isSelected ? handles.map((at, index) => <Handle key={index} at={at} ink={paint.ink} />) : null}
      <Label
        at={toScreen(view, stage, place.at)}
        outward={{ x: place.outward.x * (view.turnedOver ? -1 : 1), y: place.outward.y }}
        words={mark.kind === 'note' && label === nameOf(mark) ? '' : label}
        ink={paint.ink}
      />
    </Group>
  );
}

function Stroke({ line, paint, isSelected }: { line: PointScreenPx[]; paint: Paint; isSelected: boolean }) {
  const points = line.flatMap(({ x, y }) => [x, y]);
  const { row, ink, widthScreenPx, strength } = paint;
  const isDotted = row.dash[0] !== undefined && row.dash[0] < 1;
  const shared = { points, lineJoin: 'round' as const, listening: false };
  const dash = row.dash.length > 0 ? [...row.dash] : undefined;
  return (
    <>
      {isSelected ? <Line {...shared} stroke={ink} opacity={0.22} strokeWidth={9} lineCap="round" /> : null}
      <Line
        {...shared}
        stroke={haloInk()}
        opacity={0.72}
        strokeWidth={widthScreenPx + halo}
        lineCap="round"
        dash={isDotted ? dash : undefined}
      />
      {row.casedScreenPx ? <Line {...shared} stroke="#ffffff" strokeWidth={row.casedScreenPx} /> : null}
      <Line
        {...shared}
        stroke={ink}
        opacity={strength}
        strokeWidth={widthScreenPx}
        dash={dash}
        lineCap={isDotted ? 'round' : 'butt'}
      />
    </>
  );
}

function Handle({ at, ink }: { at: PointScreenPx; ink: string }) {
  return <Circle {...at} name="handle" radius={5} fill="#14191b" stroke={ink} strokeWidth={2} listening={false} />;
}

type LabelProps = { at: PointScreenPx; outward: PointScreenPx; words: string; ink: string };

function Label({ at, outward, words, ink }: LabelProps) {
  if (words === '') return null;
  const width = words.length * 7 + 14;
  const x = at.x + outward.x * labelAwayScreenPx - width / 2 + (outward.x * width) / 2;
  const y = at.y + outward.y * labelAwayScreenPx - 7;
  return (
    <Text
      name="label"
      x={x}
      y={y}
      width={width}
      align={outward.x > 0.4 ? 'left' : outward.x < -0.4 ? 'right' : 'center'}
      wrap="none"
      text={words}
      fill={ink}
      stroke={haloInk()}
      strokeWidth={3.2}
      fillAfterStrokeEnabled
      lineJoin="round"
      fontFamily="'Source Sans 3', 'Helvetica Neue', Arial, sans-serif"
      fontStyle="600"
      fontSize={13}
      listening={false}
    />
  );
}
