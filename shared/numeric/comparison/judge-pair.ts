import { stressDifference, type StressPair } from './stress-difference.ts';

// In standard uncertainties of the difference: 2 is |E_n| = 1, 3 is |E_n| = 1.5.
const zetaAgree = 2;
const zetaDoubtful = 3;
// Above this u/σ the test could not have failed by less than half the stress.
const weakRelativeUncertainty = 0.25;

export type PairVerdict = 'agree' | 'doubtful' | 'disagree';
export type PairJudged = {
  readonly zeta: number;
  readonly en: number;
  readonly verdict: PairVerdict;
  /** Beside "agree" only: one side is so uncertain that agreeing says little. */
  readonly weakly: boolean;
};

/**
 * Verdict on two stresses at the same point and of the same kind. Methods `compare.pair` and `compare.pair.correlated`.
 * Source: |ζ| up to 2 agrees, up to 3 is doubtful; trade practice.
 * @throws OutsideDomain missing-uncertainty and others, as `stressDifference`
 */
export function judgePair(pair: StressPair): PairJudged {
  const { zeta, en } = stressDifference(pair);
  const apart = Math.abs(zeta);
  const verdict = apart <= zetaAgree ? 'agree' : apart <= zetaDoubtful ? 'doubtful' : 'disagree';
  const relative = Math.max(pair.u1MPa / Math.abs(pair.stress1MPa), pair.u2MPa / Math.abs(pair.stress2MPa));
  return { zeta, en, verdict, weakly: verdict === 'agree' && relative > weakRelativeUncertainty };
}
