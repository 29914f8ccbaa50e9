import type { PointPx } from '#shared/contracts/marks.ts';
import type { StrokeEnd } from '#shared/vocabulary/mark-strokes.ts';

type DrawnEndsProps = {
  ends: StrokeEnd;
  /** The line as drawn, and the points it was drawn through, px of screen. */
  line: readonly PointPx[];
  points: readonly PointPx[];
  ink: string;
  words: string;
};

const barHalfPx = 6;
const arrowPx = 11;
const arrowHalfAngle = 0.45;

/** What tells a mark's stroke from another's in grey: its ends and vertices. */
export function DrawnEnds({ ends, line, points, ink, words }: DrawnEndsProps) {
  const [first, last] = tipsOf(line);
  if (!first || !last) return null;
  switch (ends) {
    case 'ring':
      return <OriginRing at={first.at} ink={ink} />;
    case 'squares':
      return points.map(({ x, y }, index) => (
        <rect key={index} x={x - 3.4} y={y - 3.4} width="6.8" height="6.8" fill={ink} stroke="var(--m-halo)" />
      ));
    case 'bars':
      return [first, last].map((tip, index) => <Haloed key={index} d={barAt(tip)} ink={ink} />);
    case 'arrow':
      return <Haloed d={arrowAt(last)} ink={ink} />;
    case 'circles':
      return [first, last].map(({ at }, index) => (
        <circle key={index} cx={at.x} cy={at.y} r="4" stroke={ink} strokeWidth="1.6" fill="var(--m-halo)" />
      ));
    case 'triangle':
      return <path d={`${arrowAt(last)}Z`} fill={ink} stroke="var(--m-halo)" />;
    case 'disc':
      return <NoteDisc at={first.at} ink={ink} words={words} />;
    case 'none':
      return null;
  }
}

function Haloed({ d, ink }: { d: string; ink: string }) {
  return (
    <>
      <path d={d} stroke="var(--m-halo)" opacity="0.72" strokeWidth="4.6" strokeLinecap="round" />
      <path d={d} stroke={ink} strokeWidth="2" strokeLinecap="round" />
    </>
  );
}

function OriginRing({ at: { x, y }, ink }: { at: PointPx; ink: string }) {
  const ring = `M${x - 7} ${y}A7 7 0 1 1 ${x + 7} ${y}A7 7 0 1 1 ${x - 7} ${y}`;
  return <Haloed d={`${ring}M${x - 13} ${y}h9M${x + 4} ${y}h9M${x} ${y - 13}v9`} ink={ink} />;
}

function NoteDisc({ at, ink, words }: { at: PointPx; ink: string; words: string }) {
  return (
    <>
      <circle cx={at.x} cy={at.y} r="9" fill="var(--m-halo)" stroke={ink} strokeWidth="1.6" />
      <text x={at.x} y={at.y + 4.5} textAnchor="middle" fontSize="12.5" fontWeight="600" fill={ink}>
        {words}
      </text>
    </>
  );
}

type Tip = { at: PointPx; angle: number };

/** Both ends of a line with the direction in which it leaves; none for no line. */
function tipsOf(line: readonly PointPx[]): [Tip?, Tip?] {
  const [first, last] = [line[0], line.at(-1)];
  if (!first || !last) return [];
  const [second, before] = [line[1] ?? first, line.at(-2) ?? last];
  return [
    { at: first, angle: Math.atan2(first.y - second.y, first.x - second.x) },
    { at: last, angle: Math.atan2(last.y - before.y, last.x - before.x) },
  ];
}

function barAt({ at, angle }: Tip): string {
  const [x, y] = [-Math.sin(angle) * barHalfPx, Math.cos(angle) * barHalfPx];
  return `M${at.x - x} ${at.y - y}L${at.x + x} ${at.y + y}`;
}

function arrowAt({ at, angle }: Tip): string {
  const wing = (turn: number) =>
    `${at.x - arrowPx * Math.cos(angle + turn)} ${at.y - arrowPx * Math.sin(angle + turn)}`;
  return `M${wing(arrowHalfAngle)}L${at.x} ${at.y}L${wing(-arrowHalfAngle)}`;
}
