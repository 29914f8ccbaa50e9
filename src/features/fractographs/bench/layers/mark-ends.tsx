import { Circle, Line, Rect, Text } from 'react-konva';
import type { StrokeEnd } from '#shared/vocabulary/mark-strokes.ts';
import type { PointScreenPx } from '../view.ts';
import { haloInk } from '../mark-paint.ts';

const barHalfScreenPx = 6;
const arrowScreenPx = 11;
const arrowHalfAngle = 0.45;

export type EndsProps = {
  ends: StrokeEnd;
  /** The line as drawn, and the points it was drawn through, screen px. */
  line: readonly PointScreenPx[];
  points: readonly PointScreenPx[];
  ink: string;
  words: string;
};

/** What tells a mark's stroke from another's in grey: its ends and vertices. */
export function MarkEnds({ ends, line, points, ink, words }: EndsProps) {
  switch (ends) {
    case 'ring':
      return <OriginRing at={line[0]} ink={ink} />;
    case 'squares':
      return points.map((at, index) => <Square key={index} at={at} ink={ink} />);
    case 'bars':
      return tipsOf(line).map((tip, index) => <Haloed key={index} points={barAt(tip)} ink={ink} width={1.8} />);
    case 'arrow':
      return <Haloed points={arrowAt(tipsOf(line)[1])} ink={ink} width={2} />;
    case 'circles':
      return tipsOf(line).map(({ at }, index) => (
        <Circle key={index} {...at} radius={4} stroke={ink} strokeWidth={1.6} fill={haloInk()} />
      ));
    case 'triangle':
      return <Line points={triangleAt(tipsOf(line)[1])} closed fill={ink} stroke={haloInk()} strokeWidth={1} />;
    case 'disc':
      return <NoteDisc at={line[0]} ink={ink} words={words} />;
    case 'none':
      return null;
  }
}

/** A stroke with its dark halo, so that it stands on any grey. */
export function Haloed({ points, ink, width }: { points: readonly number[]; ink: string; width: number }) {
  const line = { points: [...points], lineCap: 'round' as const, listening: false };
  return (
    <>
      <Line {...line} stroke={haloInk()} opacity={0.72} strokeWidth={width + 2.6} />
      <Line {...line} stroke={ink} strokeWidth={width} />
    </>
  );
}

function OriginRing({ at, ink }: { at: PointScreenPx; ink: string }) {
  const { x, y } = at;
  const ticks = [
    [x - 16, y, x - 5, y],
    [x + 5, y, x + 16, y],
    [x, y - 16, x, y - 5],
  ];
  return (
    <>
      <Circle x={x} y={y} radius={9} stroke={haloInk()} opacity={0.72} strokeWidth={4.6} />
      {ticks.map((points, index) => (
        <Haloed key={index} points={points} ink={ink} width={2} />
      ))}
      <Circle x={x} y={y} radius={9} stroke={ink} strokeWidth={2} />
    </>
  );
}

function Square({ at, ink }: { at: PointScreenPx; ink: string }) {
  return <Rect x={at.x - 3.6} y={at.y - 3.6} width={7.2} height={7.2} fill={ink} stroke={haloInk()} strokeWidth={1} />;
}

function NoteDisc({ at, ink, words }: { at: PointScreenPx; ink: string; words: string }) {
  return (
    <>
      <Circle {...at} radius={9} fill={haloInk()} stroke={ink} strokeWidth={1.6} />
      <Text
        x={at.x - 9}
        y={at.y - 6}
        width={18}
        align="center"
        text={words}
        fill={ink}
        fontFamily="'Source Sans 3', sans-serif"
        fontStyle="600"
        fontSize={12}
      />
    </>
  );
}

type Tip = { at: PointScreenPx; angle: number };

/** Both ends of a line with the direction in which it leaves. */
function tipsOf(line: readonly PointScreenPx[]): [Tip, Tip] {
  const [first, second] = [line[0], line[1] ?? line[0]];
  const [last, before] = [line[line.length - 1], line[line.length - 2] ?? line[0]];
  return [
    { at: first, angle: Math.atan2(first.y - second.y, first.x - second.x) },
    { at: last, angle: Math.atan2(last.y - before.y, last.x - before.x) },
  ];
}

function barAt({ at, angle }: Tip): number[] {
  const [x, y] = [-Math.sin(angle) * barHalfScreenPx, Math.cos(angle) * barHalfScreenPx];
  return [at.x - x, at.y - y, at.x + x, at.y + y];
}

function arrowAt({ at, angle }: Tip): number[] {
  const wing = (turn: number) => [
    at.x - arrowScreenPx * Math.cos(angle + turn),
    at.y - arrowScreenPx * Math.sin(angle + turn),
  ];
  return [...wing(arrowHalfAngle), at.x, at.y, ...wing(-arrowHalfAngle)];
}

function triangleAt(tip: Tip): number[] {
  return arrowAt(tip);
}
