import { Circle, Group, Layer, Line } from 'react-konva';
import { markKindTable, type MarkKindRow } from '#shared/vocabulary/mark-kinds.ts';
import type { BenchState } from '../bench-state.ts';
import { smoothLine } from '../kinds/shapes/chain.ts';
import { haloInk, inkOf } from '../mark-paint.ts';
import { toScreen, type PointScreenPx } from '../view.ts';
import { Haloed } from './mark-ends.tsx';

/** What is under way: points set so far, the line to the reticle, and the reticle. */
export function DrawingLayer({ state }: { state: BenchState }) {
  const { view, stage, tool, points, reticle } = state;
  const onStage = (point: { x: number; y: number }) => toScreen(view, stage, point);
  const row: MarkKindRow | null = tool && tool !== 'scale bar' ? markKindTable[tool] : null;
  const ink = row ? inkOf(row.colour) : '#ffffff';
  const line = smoothLine(points.length > 0 ? [...points, reticle] : []).map(onStage);
  return (
    <Layer listening={false}>
      {line.length > 1 ? (
        <Haloed points={line.flatMap(({ x, y }) => [x, y])} ink={ink} width={row?.widthScreenPx ?? 1.6} />
      ) : null}
      {points.map(onStage).map((at, index) => (
        <Circle key={index} {...at} radius={4.5} fill="#14191b" stroke={ink} strokeWidth={2} />
      ))}
      <Reticle at={onStage(reticle)} />
    </Layer>
  );
}

const arms = [
  [-16, 0, -5, 0],
  [5, 0, 16, 0],
  [0, -16, 0, -5],
  [0, 5, 0, 16],
];

function Reticle({ at }: { at: PointScreenPx }) {
  return (
    <Group x={at.x} y={at.y} name="reticle">
      {arms.map((points, index) => (
        <Line key={index} points={points} stroke={haloInk()} strokeWidth={4.5} opacity={0.8} />
      ))}
      {arms.map((points, index) => (
        <Line key={index} points={points} stroke="#ffffff" strokeWidth={1.6} />
      ))}
    </Group>
  );
}
