import { requireFinite, requirePositive, requireThat } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

/** Mirrors of one boundary in parts of one material, each with the stress its part broke at. */
export type MirrorLot = {
  /** n values, mm, each > 0, in the order of the stresses. */
  readonly radiiMm: readonly number[];
  /** n values, MPa, each > 0. */
  readonly stressesMPa: readonly number[];
};

/** One mirror as the straight lines take it: x = 1/√R. */
export type MirrorPoint = { readonly perRootMetre: number; readonly radiusMm: number; readonly stressMPa: number };

/**
 * The mirrors of a lot, one by one.
 * @throws OutsideDomain, the first that applies: non-finite-input, too-few-points (fewer than `fewest`, or one list shorter
 * than the other), non-positive-mirror-radius, non-positive-stress
 */
export function mirrorPoints(lot: MirrorLot, fewest: number): MirrorPoint[] {
  const { radiiMm, stressesMPa } = lot;
  for (const radius of radiiMm) requireFinite({ radiiMm: radius });
  for (const stress of stressesMPa) requireFinite({ stressesMPa: stress });
  requireThat(radiiMm.length >= Math.max(fewest, stressesMPa.length), 'too-few-points', 'radiiMm');
  requireThat(stressesMPa.length >= radiiMm.length, 'too-few-points', 'stressesMPa');
  for (const radius of radiiMm) requirePositive({ radiiMm: radius }, 'non-positive-mirror-radius');
  for (const stress of stressesMPa) requirePositive({ stressesMPa: stress }, 'non-positive-stress');
  return radiiMm.map((radiusMm, index) => ({
    perRootMetre: 1 / rootMetresFromMm(radiusMm),
    radiusMm,
    stressMPa: stressesMPa[index] ?? Number.NaN,
  }));
}
