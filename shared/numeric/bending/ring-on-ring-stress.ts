import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';
import { requirePoissonRatio } from './require-poisson-ratio.ts';

export type RingOnRingDisc = {
  /** Load on the upper ring, N, ≥ 0. */
  readonly loadN: number;
  /** Of the disc, mm, > 0. */
  readonly thicknessMm: number;
  /** Dimensionless, ≥ 0, < 0.5. */
  readonly poissonRatio: number;
  /** Of the lower ring, mm, > load diameter. */
  readonly supportDiameterMm: number;
  /** Of the upper ring, mm, > 0. */
  readonly loadDiameterMm: number;
  /** Of the disc, mm, ≥ support diameter. */
  readonly discDiameterMm: number;
};

/**
 * Stress on the tensile face of a disc within the load ring, the same in all directions there, MPa, ≥ 0.
 * Method `disc.ringOnRing`.
 *
 * Holds for a thin, flat, elastic disc on two rings with one centre; friction and the contact stress at the rings are left
 * out. Exact within thin-plate theory with the overhang; rounding only.
 * Source: form of ASTM C1499 (from memory), equal to the thin-plate solution:
 * sigma = 3F/(2πh²) [(1−ν)(Ds²−DL²)/(2D²) + (1+ν) ln(Ds/DL)].
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, poisson-out-of-range,
 * diameters-out-of-order, negative-load
 * @example ringOnRingStressMPa({ loadN: 1000, thicknessMm: 2, poissonRatio: 0.22, supportDiameterMm: 30, loadDiameterMm: 10, discDiameterMm: 36 }) // 188.72…
 */
export function ringOnRingStressMPa(disc: RingOnRingDisc): number {
  const { loadN, thicknessMm, poissonRatio, supportDiameterMm, loadDiameterMm, discDiameterMm } = disc;
  requireFinite({ loadN, thicknessMm, poissonRatio, supportDiameterMm, loadDiameterMm, discDiameterMm });
  requirePositive({ thicknessMm, supportDiameterMm, loadDiameterMm, discDiameterMm }, 'non-positive-dimension');
  requirePoissonRatio({ poissonRatio });
  requireThat(loadDiameterMm < supportDiameterMm, 'diameters-out-of-order', 'loadDiameterMm');
  requireThat(supportDiameterMm <= discDiameterMm, 'diameters-out-of-order', 'supportDiameterMm');
  requireNotNegative({ loadN }, 'negative-load');
  const overhang = ((1 - poissonRatio) * (supportDiameterMm ** 2 - loadDiameterMm ** 2)) / (2 * discDiameterMm ** 2);
  const betweenRings = (1 + poissonRatio) * Math.log(supportDiameterMm / loadDiameterMm);
  return plateStressUnitMPa(disc) * (overhang + betweenRings);
}

/** 3F/(2πh²), MPa: the stress that the ring formulas are multiples of. */
export function plateStressUnitMPa(disc: { readonly loadN: number; readonly thicknessMm: number }): number {
  return (3 * disc.loadN) / (2 * Math.PI * disc.thicknessMm ** 2);
}
