import { mirrorStressMPa, type FractureMirror } from '../mirror/mirror-stress.ts';

/**
 * Change of the mirror stress per unit of the constant (MPa per MPa√m) and of the radius (MPa/mm).
 * Source: derivatives of A/√R. Refuses as `mirror.stress`.
 */
export function mirrorSensitivities(mirror: FractureMirror) {
  const stressMPa = mirrorStressMPa(mirror);
  return { A: stressMPa / mirror.mirrorConstantMPaRootM, R: -stressMPa / (2 * mirror.radiusMm) };
}
