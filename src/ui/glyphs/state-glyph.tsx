import { Glyph } from './glyph.tsx';

export type StateShape = 'received' | 'examining' | 'drafting' | 'in review' | 'closed' | 'on hold' | 'withdrawn';

type StateGlyphProps = {
  state: StateShape;
  /** How far the case had come before it was held or withdrawn; no stroke is heavy where it isn't known. */
  cameTo?: 'received' | 'examining' | 'drafting' | 'in review';
  /** A closed case with an amendment in progress. */
  amending?: boolean;
  size?: number;
};

const strokes = [
  'M8.9 13.1L2.4 11.2',
  'M10.1 11.4L6 6',
  'M12 10.8V4',
  'M13.9 11.4L18 6',
  'M15.1 13.1L21.6 11.2',
] as const;

const heavy: Record<'received' | 'examining' | 'drafting' | 'in review' | 'closed', number> = {
  received: 1,
  examining: 2,
  drafting: 3,
  'in review': 4,
  closed: 5,
};

/** A fan of five strokes, as many heavy as the case has come. An arc closes it; a bar holds it; a stroke withdraws it. */
export function StateGlyph({ state, cameTo, amending = false, size = 24 }: StateGlyphProps) {
  const reached = state === 'on hold' || state === 'withdrawn' ? cameTo : state;
  const count = reached ? heavy[reached] : 0;
  return (
    <Glyph width={size} height={(size * 17) / 24} viewBox="0 0 24 17">
      {strokes.map((d, index) => (
        <path
          key={d}
          d={d}
          stroke="currentColor"
          strokeLinecap="round"
          strokeWidth={index < count ? 2 : 1}
          opacity={index < count ? 1 : 0.38}
        />
      ))}
      <circle cx="12" cy="14" r="1.5" fill="currentColor" />
      {state === 'closed' ? (
        <path
          d="M.9 11.2A11.6 11.6 0 0 1 23.1 11.2"
          stroke="currentColor"
          strokeWidth="1.5"
          strokeDasharray={amending ? '2.5 2' : undefined}
        />
      ) : null}
      {state === 'on hold' ? <path d="M2 16.4H22" stroke="currentColor" strokeWidth="1.6" /> : null}
      {state === 'withdrawn' ? <path d="M3 15.2L21 3" stroke="currentColor" strokeWidth="1.5" /> : null}
    </Glyph>
  );
}
