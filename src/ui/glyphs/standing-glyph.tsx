import { Glyph } from './glyph.tsx';

export type StandingShape = 'known' | 'told' | 'assumed';

/** A block on the ground: known full and resting, told half full, assumed dashed and off the ground. */
export function StandingGlyph({ standing }: { standing: StandingShape }) {
  return (
    <Glyph width={16} height={15}>
      {standing === 'known' ? <rect x="3.5" y="4" width="9" height="8.4" fill="currentColor" /> : null}
      {standing === 'told' ? (
        <>
          <rect x="4.1" y="4.6" width="7.8" height="7.2" stroke="currentColor" strokeWidth="1.2" />
          <rect x="3.5" y="8.4" width="9" height="4" fill="currentColor" />
        </>
      ) : null}
      {standing === 'assumed' ? (
        <rect
          x="4.1"
          y="2.6"
          width="7.8"
          height="7.2"
          stroke="currentColor"
          strokeWidth="1.2"
          strokeDasharray="2 1.7"
        />
      ) : null}
      <path d="M1 13.4H15" stroke="currentColor" strokeWidth="1.3" />
    </Glyph>
  );
}
