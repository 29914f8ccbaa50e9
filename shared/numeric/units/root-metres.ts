const mmPerMetre = 1000;

/**
 * √ of a length, in √m, from a length in mm, ≥ 0. The one place where mm become metres under a root, as toughness and
 * mirror constants in MPa√m ask for.
 * @example rootMetresFromMm(0.25) // 0.01581…
 */
export function rootMetresFromMm(lengthMm: number): number {
  return Math.sqrt(lengthMm / mmPerMetre);
}
