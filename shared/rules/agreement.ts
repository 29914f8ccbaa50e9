import { agreementPattern, type AgreementPattern } from '../numeric/comparison/agreement-pattern.ts';
import { chiSquaredLimit } from '../numeric/comparison/chi-squared-limit.ts';
import { judgePair, type PairJudged, type PairVerdict } from '../numeric/comparison/judge-pair.ts';
import { pooledStress, type PooledStress } from '../numeric/comparison/pooled-stress.ts';
import type { EstimateLine, Verdict } from '../vocabulary/estimate-lines.ts';

/** Version of the rule below; kept with every verdict, so that an old one can be read by the rule it was given under. */
export const agreementRuleVersion = 1;

/** An input that several lines may share, such as the scale of one image. */
export type SharedInput = {
  /** The same in both lines: `calibration:…`. */
  readonly key: string;
  /** Shown: "scale of the image". */
  readonly label: string;
  /** Sensitivity × standard uncertainty, signed, MPa; for the scale of a mirror −½ σ u(s)/s. */
  readonly contributionMPa: number;
};

export type LineReading = {
  readonly line: EstimateLine;
  readonly stressMPa: number;
  /** MPa, > 0. */
  readonly standardUncertaintyMPa: number;
  readonly setAside: boolean;
  readonly shared: readonly SharedInput[];
};

export type JudgedPair = PairJudged & {
  readonly lines: readonly [EstimateLine, EstimateLine];
  /** Labels of what they share, for "two lines, one scale". */
  readonly sharedInputs: readonly string[];
};

export type Agreement = {
  readonly ruleVersion: typeof agreementRuleVersion;
  readonly verdict: Verdict;
  readonly weakly: boolean;
  readonly pairs: readonly JudgedPair[];
  /** `null` with fewer than two lines. */
  readonly chiSquared: number | null;
  readonly chiSquaredOverLimit: boolean;
  /** `null` with fewer than three lines. */
  readonly pattern: AgreementPattern | null;
  /** The common stress; `null` when χ² is over its limit or there are fewer than two lines. */
  readonly pooled: PooledStress | null;
};

/**
 * Verdict on a case: the worst pair among the lines not set aside; χ² over its 95 % limit lowers agree to doubtful; fewer
 * than two lines are too few. At most one reading a line.
 * @throws OutsideDomain missing-uncertainty, when a line that counts has none
 */
export function judgeAgreement(readings: readonly LineReading[]): Agreement {
  const counted = readings.filter((reading) => !reading.setAside);
  const pairs = pairsOf(counted);
  if (pairs.length === 0) return { ...nothingToCompare, ruleVersion: agreementRuleVersion };
  const covariancesMPa2 = counted.map((one) => counted.map((other) => covariance(one, other)));
  const pooled = pooledStress({ stressesMPa: counted.map((reading) => reading.stressMPa), covariancesMPa2 });
  const limit = chiSquaredLimit(counted.length);
  const chiSquaredOverLimit = limit !== undefined && pooled.chiSquared > limit;
  const worst = worstOf(pairs);
  const verdict = worst === 'agree' && chiSquaredOverLimit ? 'doubtful' : worst;
  return {
    ruleVersion: agreementRuleVersion,
    verdict,
    weakly: verdict === 'agree' && pairs.some((pair) => pair.weakly),
    pairs,
    chiSquared: pooled.chiSquared,
    chiSquaredOverLimit,
    pattern: counted.length < 3 ? null : agreementPattern(counted, pairs.map(withAgrees)),
    pooled: chiSquaredOverLimit ? null : pooled,
  };
}

const nothingToCompare = {
  verdict: 'too few',
  weakly: false,
  pairs: [],
  chiSquared: null,
  chiSquaredOverLimit: false,
  pattern: null,
  pooled: null,
} as const;

function pairsOf(readings: readonly LineReading[]): JudgedPair[] {
  return readings.flatMap((one, index) => readings.slice(index + 1).map((other) => judgedPair(one, other)));
}

function judgedPair(one: LineReading, other: LineReading): JudgedPair {
  const judged = judgePair({
    stress1MPa: one.stressMPa,
    u1MPa: one.standardUncertaintyMPa,
    stress2MPa: other.stressMPa,
    u2MPa: other.standardUncertaintyMPa,
    covarianceMPa2: covariance(one, other),
  });
  const sharedInputs = one.shared.filter((input) => other.shared.some((each) => each.key === input.key));
  return { ...judged, lines: [one.line, other.line], sharedInputs: sharedInputs.map((input) => input.label) };
}

function covariance(one: LineReading, other: LineReading): number {
  if (one === other) return one.standardUncertaintyMPa ** 2;
  return one.shared.reduce((sum, input) => {
    const same = other.shared.find((each) => each.key === input.key);
    return same ? sum + input.contributionMPa * same.contributionMPa : sum;
  }, 0);
}

function worstOf(pairs: readonly JudgedPair[]): PairVerdict {
  if (pairs.some((pair) => pair.verdict === 'disagree')) return 'disagree';
  return pairs.some((pair) => pair.verdict === 'doubtful') ? 'doubtful' : 'agree';
}

function withAgrees(pair: JudgedPair) {
  return { lines: pair.lines, agrees: pair.verdict === 'agree' };
}
