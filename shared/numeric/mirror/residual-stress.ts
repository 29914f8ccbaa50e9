import { requireFinite } from '../require.ts';
import { mirrorStressMPa, type FractureMirror } from './mirror-stress.ts';

/**
 * Residual stress at the origin from its mirror and the applied stress, MPa, tension positive. Method `mirror.residual`.
 * The applied stress has its sign too, and no limits.
 *
 * Holds as `mirror.stress`, with a constant from stress-free material. A stress confined to the flaw does not show.
 * Source: A/√R = sigma applied + sigma residual.
 * @throws OutsideDomain, the first that applies: those of `mirror.stress`, then non-finite-input
 * @example residualStressMPa({ mirrorConstantMPaRootM: 1.9, radiusMm: 0.3, appliedStressMPa: 140 }) // −30.30…
 */
export function residualStressMPa(mirror: FractureMirror & { readonly appliedStressMPa: number }): number {
  const { appliedStressMPa } = mirror;
  const totalMPa = mirrorStressMPa(mirror);
  requireFinite({ appliedStressMPa });
  return totalMPa - appliedStressMPa;
}
