import { requireFinite, requirePositive } from '../require.ts';
import { rootMetresFromMm } from '../units/root-metres.ts';

export type FractureMirror = {
  /** Constant of the same boundary as the radius, MPa√m, > 0. */
  readonly mirrorConstantMPaRootM: number;
  /** From the origin to the boundary, mm, > 0; along the tensile face in a bent bar. */
  readonly radiusMm: number;
};

/**
 * Total tensile stress at the origin when the part broke, applied and residual together, MPa, > 0. Method `mirror.stress`.
 *
 * Holds while the mirror is small against the section and large against the flaw, and when radius and constant name the
 * same boundary. Rounding only.
 * Source: sigma √R = A.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-mirror-radius, non-positive-mirror-constant
 * @example mirrorStressMPa({ mirrorConstantMPaRootM: 2, radiusMm: 0.45 }) // 94.28…
 */
export function mirrorStressMPa(mirror: FractureMirror): number {
  const { mirrorConstantMPaRootM, radiusMm } = mirror;
  requireFinite({ mirrorConstantMPaRootM, radiusMm });
  requirePositive({ radiusMm }, 'non-positive-mirror-radius');
  requirePositive({ mirrorConstantMPaRootM }, 'non-positive-mirror-constant');
  return mirrorConstantMPaRootM / rootMetresFromMm(radiusMm);
}
