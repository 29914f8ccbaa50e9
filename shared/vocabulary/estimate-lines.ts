/** The lines of evidence for the stress at the origin. */
export const estimateLines = ['load', 'mirror', 'flaw'] as const;
export type EstimateLine = (typeof estimateLines)[number];

export const verdicts = ['agree', 'doubtful', 'disagree', 'too few'] as const;
export type Verdict = (typeof verdicts)[number];
