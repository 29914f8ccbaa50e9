import { Glyph } from './glyph.tsx';

export type VerdictShape = 'agree' | 'doubtful' | 'disagree' | 'too few';

/** The colour class of each verdict; the word and the form carry the meaning without it. */
export const verdictColour: Record<VerdictShape, string> = {
  agree: 'text-celadon',
  doubtful: 'text-ochre',
  disagree: 'text-iron',
  'too few': 'text-ink-3',
};

const offsets: Record<VerdictShape, readonly [number, number, number]> = {
  agree: [0, 0, 0],
  doubtful: [0, 0, 4.5],
  disagree: [-4, -2, 8],
  'too few': [0, 0, 0],
};

/** Three small intervals: lined up, one drifting, one away, or one with two dotted. */
export function VerdictGlyph({ verdict, size = 20 }: { verdict: VerdictShape; size?: number }) {
  return (
    <Glyph width={size} height={size * 0.8} viewBox="0 0 20 16" className={verdictColour[verdict]}>
      {offsets[verdict].map((offset, index) => (
        <Interval
          key={index}
          y={3 + 5 * index}
          offset={offset}
          verdict={verdict}
          missing={verdict === 'too few' && index > 0}
        />
      ))}
    </Glyph>
  );
}

type IntervalProps = { y: number; offset: number; verdict: VerdictShape; missing: boolean };

function Interval({ y, offset, verdict, missing }: IntervalProps) {
  if (missing) return <path d={`M5 ${y}H15`} stroke="currentColor" strokeDasharray="1.5 2" opacity={0.8} />;
  const half = verdict === 'disagree' ? 4 : 5;
  const middle = verdict === 'disagree' ? 8 + offset : 10 + offset;
  return (
    <>
      <path d={`M${middle - half} ${y}H${middle + half}`} stroke="currentColor" strokeWidth="1.3" />
      <circle cx={middle} cy={y} r="1.9" fill="currentColor" />
    </>
  );
}
