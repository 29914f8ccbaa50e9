import { mirrorStressMPa, type FractureMirror } from '../mirror/mirror-stress.ts';

/**
 * Change of the residual stress per unit of the constant (MPa per MPa√m), the radius (MPa/mm) and the applied stress.
 * Source: derivatives of A/√R − sigma applied. Refuses as `mirror.stress`.
 */
export function residualStressSensitivities(mirror: FractureMirror) {
  const totalMPa = mirrorStressMPa(mirror);
  return { A: totalMPa / mirror.mirrorConstantMPaRootM, R: -totalMPa / (2 * mirror.radiusMm), appliedStress: -1 };
}
