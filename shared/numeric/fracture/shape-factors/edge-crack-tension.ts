import { requireEdgeCrack, type EdgeCrack } from './edge-crack.ts';

/**
 * Shape factor of a straight crack through the whole width in tension, √π inside. Method `Y.edge.tension`.
 *
 * Holds for a/W ≤ 0.6 (range from memory), ends free to turn.
 * Source: Tada's polynomial as quoted in public code: √π (1.12 − 0.231α + 10.55α² − 21.72α³ + 30.39α⁴).
 * @throws OutsideDomain, the first that applies: non-finite-input, flaw-deeper-than-section (a/W ≥ 1),
 * outside-validity-range (a/W < 0 or > 0.6)
 * @example edgeCrackTension({ depthOverSection: 0.1 }) // 2.09808…
 */
export function edgeCrackTension(crack: EdgeCrack): number {
  const ratio = requireEdgeCrack(crack);
  const polynomial = 1.12 - 0.231 * ratio + 10.55 * ratio ** 2 - 21.72 * ratio ** 3 + 30.39 * ratio ** 4;
  return Math.sqrt(Math.PI) * polynomial;
}
