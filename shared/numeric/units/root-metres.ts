const mmPerMetre = 1000;

/**
 * √ of a length, in √m, from a length in mm, ≥ 0. The one place where mm become metres under a root, as toughness and
 * mirror constants in MPa√m ask for.
 * @example rootMetresFromMm(0.25) // 0.01581…
 */
export function rootMetresFromMm(lengthMm: number): number {
  return Math.sqrt(lengthMm / mmPerMetre);
}

/**
 * A length in mm from its root in √m, ≥ 0: the same step back.
 * @example mmFromRootMetres(0.01581) // 0.2499…
 */
export function mmFromRootMetres(rootMetres: number): number {
  return rootMetres ** 2 * mmPerMetre;
}
