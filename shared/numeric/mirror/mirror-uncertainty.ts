import { requireFinite, requireNotNegative } from '../require.ts';
import { mirrorStressMPa, type FractureMirror } from './mirror-stress.ts';

export type UncertainMirror = FractureMirror & {
  /** Standard uncertainty of the constant, MPa√m, ≥ 0. */
  readonly uMirrorConstantMPaRootM: number;
  /** Standard uncertainty of the radius, mm, ≥ 0. */
  readonly uRadiusMm: number;
};

/**
 * Relative standard uncertainty of a mirror stress, dimensionless, ≥ 0. Method `mirror.uncertainty`.
 *
 * First order, constant and radius independent.
 * Source: (u/sigma)² = (u_A/A)² + (u_R/2R)², derivatives of A/√R.
 * @throws OutsideDomain, the first that applies: those of `mirror.stress`, non-finite-input, negative-uncertainty
 * @example relativeMirrorUncertainty({ mirrorConstantMPaRootM: 2, uMirrorConstantMPaRootM: 0.1, radiusMm: 0.45, uRadiusMm: 0.03 }) // 0.06009…
 */
export function relativeMirrorUncertainty(mirror: UncertainMirror): number {
  const { mirrorConstantMPaRootM, radiusMm, uMirrorConstantMPaRootM, uRadiusMm } = mirror;
  mirrorStressMPa(mirror);
  requireFinite({ uMirrorConstantMPaRootM, uRadiusMm });
  requireNotNegative({ uMirrorConstantMPaRootM, uRadiusMm }, 'negative-uncertainty');
  return Math.hypot(uMirrorConstantMPaRootM / mirrorConstantMPaRootM, uRadiusMm / (2 * radiusMm));
}
