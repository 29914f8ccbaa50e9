import { requireEdgeCrack, type EdgeCrack } from './edge-crack.ts';

/**
 * Shape factor of a straight crack through the whole width in pure bending, √π inside; goes with the outer-fibre stress.
 * Method `Y.edge.bending`. At no depth 1.99, against the exact 1.1215 √π = 1.988.
 *
 * Holds for four-point bending between the inner rollers, a/W ≤ 0.6; within 0.2 % of Tada's form.
 * Source: Brown and Srawley, ASTM STP 410 (1966), from memory.
 * @throws OutsideDomain, the first that applies: non-finite-input, flaw-deeper-than-section (a/W ≥ 1),
 * outside-validity-range (a/W < 0 or > 0.6)
 * @example edgeCrackBending({ depthOverSection: 0.3 }) // 1.99159
 */
export function edgeCrackBending(crack: EdgeCrack): number {
  const ratio = requireEdgeCrack(crack);
  return 1.99 - 2.47 * ratio + 12.97 * ratio ** 2 - 23.17 * ratio ** 3 + 24.8 * ratio ** 4;
}
