import { plateStressUnitMPa, ringOnRingStressMPa, type RingOnRingDisc } from '../bending/ring-on-ring-stress.ts';

/**
 * Change of the ring-on-ring stress per unit of load (MPa/N), length (MPa/mm) and Poisson's ratio (MPa).
 * Source: derivatives of 3F/(2πh²) [(1−ν)(Ds²−DL²)/(2D²) + (1+ν) ln(Ds/DL)]. Refuses as `disc.ringOnRing`.
 */
export function ringOnRingSensitivities(disc: RingOnRingDisc) {
  const stressMPa = ringOnRingStressMPa(disc);
  const unitMPa = plateStressUnitMPa(disc);
  const { poissonRatio, supportDiameterMm: support, loadDiameterMm: load, discDiameterMm: whole } = disc;
  const ringsMm2 = support ** 2 - load ** 2;
  return {
    load: ringOnRingStressMPa({ ...disc, loadN: 1 }),
    thickness: (-2 * stressMPa) / disc.thicknessMm,
    poisson: unitMPa * (Math.log(support / load) - ringsMm2 / (2 * whole ** 2)),
    supportDiameter: unitMPa * (((1 - poissonRatio) * support) / whole ** 2 + (1 + poissonRatio) / support),
    loadDiameter: -unitMPa * (((1 - poissonRatio) * load) / whole ** 2 + (1 + poissonRatio) / load),
    discDiameter: (-unitMPa * (1 - poissonRatio) * ringsMm2) / whole ** 3,
  };
}
