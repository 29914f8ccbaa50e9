const piece = { stroke: 'var(--control)', strokeWidth: 1.4, strokeDasharray: '5 4', strokeLinejoin: 'round' } as const;

/** What belongs in an empty chapter of evidence: a part and the pieces it fell into, still to come. */
export function PiecesHint() {
  return (
    <svg viewBox="0 0 220 96" width="220" className="h-auto max-w-full" fill="none" aria-hidden>
      <path d="M8 20L66 12L84 44L72 80L14 84Z" {...piece} />
      <path d="M96 14L150 10L140 44L104 50Z" {...piece} />
      <path d="M100 60L142 54L158 82L92 86Z" {...piece} />
      <path d="M166 24L206 18L212 74L172 80L156 48Z" {...piece} />
    </svg>
  );
}
