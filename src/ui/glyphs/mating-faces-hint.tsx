const face = { stroke: 'var(--control)', strokeWidth: 1.4 };

const rays =
  'M168 130Q194 114 222 108M215.3 106L222 108L216.7 112.6M150 112Q162 84 184 64M177.2 65.6L184 64L181.7 70.6' +
  'M122 112Q114 90 102 66M101.7 73L102 66L107.7 70M132 141a6 6 0 1 0 12 0a6 6 0 1 0-12 0M126 141h6M144 141h6M138 129v6';

/** What belongs in an empty chapter of fractographs: a face with its origin, and its mating face still to come. */
export function MatingFacesHint() {
  return (
    <svg viewBox="68 8 364 166" width="364" className="h-auto max-w-full" fill="none" aria-hidden>
      <path d="M236 20H84L76 28V140L84 148H236L244 140V28Z" {...face} />
      <path d="M243 40C190 50 130 34 77 44" stroke="var(--rule)" strokeWidth="1.2" />
      <path d="M162 148C162 114 114 114 114 148" {...face} strokeDasharray="6 4" />
      <path d={rays} stroke="var(--ink-3)" strokeWidth="1.4" />
      <g transform="translate(500 0) scale(-1 1)">
        <path d="M236 20H84L76 28V140L84 148H236L244 140V28Z" {...face} strokeDasharray="5 4" />
        <path d="M243 40C190 50 130 34 77 44" stroke="var(--rule)" strokeWidth="1.2" />
        <path d="M162 148C162 114 114 114 114 148" {...face} strokeDasharray="6 4" />
        <path d={rays} stroke="var(--rule)" strokeWidth="1.4" />
      </g>
      <path d="M250 12V156" stroke="var(--hairline)" />
      <path d="M76 162v6M76 165H126M126 162v6" stroke="var(--control)" />
      <text x="134" y="169.5" fontSize="12.5" fill="var(--ink-3)">
        scale
      </text>
      <text x="424" y="169.5" fontSize="12.5" textAnchor="end" fill="var(--ink-3)">
        its mating face
      </text>
    </svg>
  );
}
