import { agreementPattern, type AgreementPattern } from './agreement-pattern.ts';
import { chiSquaredLimit } from './chi-squared-limit.ts';
import { judgePair } from './judge-pair.ts';
import { pooledStress, type PooledStress } from './pooled-stress.ts';

export type LineStress = {
  /** Name of the line of evidence: load, mirror, flaw. */
  readonly line: string;
  readonly stressMPa: number;
  /** Standard uncertainty, MPa, > 0. */
  readonly uMPa: number;
};

export type TripleCompared = {
  /** ζ of the first and second, first and third, second and third line. */
  readonly zetas: readonly [number, number, number];
  readonly chiSquared: number;
  readonly pattern: AgreementPattern;
  /** Absent when χ² is over its limit: then the three have no common value. */
  readonly pooled?: PooledStress;
};

/**
 * Three stresses at one point from inputs they do not share: their pairs, their pattern and their common value. Method
 * `compare.triple`. `lines`: three, in the order of the ζ.
 * Source: pair test and weighted mean; pattern from which pairs agree, trade practice.
 * @throws OutsideDomain non-finite-input, missing-uncertainty
 */
export function compareTriple(lines: readonly [LineStress, LineStress, LineStress]): TripleCompared {
  const [first, second, third] = lines;
  const pairs = [judged(first, second), judged(first, third), judged(second, third)] as const;
  const pooled = pooledStress({
    stressesMPa: lines.map(({ stressMPa }) => stressMPa),
    covariancesMPa2: lines.map((one) => lines.map((other) => (one === other ? one.uMPa ** 2 : 0))),
  });
  const limit = chiSquaredLimit(lines.length) ?? Number.NaN;
  return {
    zetas: [pairs[0].zeta, pairs[1].zeta, pairs[2].zeta],
    chiSquared: pooled.chiSquared,
    pattern: agreementPattern(lines, pairs),
    ...(pooled.chiSquared <= limit && { pooled }),
  };
}

function judged(one: LineStress, other: LineStress) {
  const { zeta, verdict } = judgePair({
    stress1MPa: one.stressMPa,
    u1MPa: one.uMPa,
    stress2MPa: other.stressMPa,
    u2MPa: other.uMPa,
    covarianceMPa2: 0,
  });
  return { zeta, agrees: verdict === 'agree', lines: [one.line, other.line] as const };
}
