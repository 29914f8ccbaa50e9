import type { FourPointBar } from '../bending/four-point-bending-stress.ts';
import { fourPointLocalStress } from '../bending/four-point-local-stress.ts';
import type { OriginInBar } from '../bending/local-stress.ts';
import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

export type FlawInFourPointBar = FourPointBar &
  OriginInBar & {
    /** Radius of the flaw, mm, > 0; y is the depth of its centre. */
    readonly flawRadiusMm: number;
  };

/**
 * Apparent toughness of a round flaw below the tensile face of a four-point bar, MPa√m, from the stress at its centre.
 * Method `flaw.apparentToughness.embedded`.
 *
 * Holds for a flaw small against its cover and the depth; the fall of stress across the flaw is left out (see
 * `K.penny.gradient`). Rounding only.
 * Source: K = Y sigma √a, Y = 2/√π, sigma at the centre of the flaw.
 * @throws OutsideDomain, the first that applies: those of `bend4.rect.local`, non-positive-flaw-size, outside-validity-range
 * (the flaw reaches through the tensile face), non-positive-stress (the centre is not in tension)
 * @example embeddedApparentToughness({ …, flawRadiusMm: 0.045 }).apparentToughnessMPaRootM // 2.67478…
 */
export function embeddedApparentToughness(flaw: FlawInFourPointBar): {
  readonly localStressMPa: number;
  readonly apparentToughnessMPaRootM: number;
} {
  const { flawRadiusMm, ...bar } = flaw;
  requireFinite({ ...bar, flawRadiusMm });
  const { localStressMPa } = fourPointLocalStress(bar);
  requirePositive({ flawRadiusMm }, 'non-positive-flaw-size');
  requireThat(bar.yMm >= flawRadiusMm, 'outside-validity-range', 'yMm');
  requireThat(localStressMPa > 0, 'non-positive-stress', 'yMm');
  return { localStressMPa, apparentToughnessMPaRootM: pennyRoot(flawRadiusMm) * localStressMPa };
}

/** K per stress of a round crack, √m. */
function pennyRoot(radiusMm: number): number {
  return (2 / Math.sqrt(Math.PI)) * rootMetresFromMm(radiusMm);
}
