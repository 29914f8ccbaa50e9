import { requireFinite, requirePositive } from '../require.ts';
import { requirePoissonRatio } from './require-poisson-ratio.ts';
import { requireFourPointSpans, type FourPointSpans } from './require-spans.ts';

export type StressedBar = FourPointSpans & {
  /** On the outer fibre at fracture, MPa, > 0. */
  readonly stressMPa: number;
  /** Elastic modulus, GPa, > 0. */
  readonly modulusGPa: number;
  /** Section across the load, mm, > 0. */
  readonly widthMm: number;
  /** Section along the load, mm, > 0. */
  readonly depthMm: number;
  /** Fracture toughness, MPa√m, > 0. */
  readonly toughnessMPaRootM: number;
  /** Dimensionless, ≥ 0, < 0.5. */
  readonly poissonRatio: number;
};

export type StoredEnergy = {
  /** In the bent bar at fracture, mJ. */
  readonly energyMJ: number;
  /** To drive a crack, J/m². */
  readonly energyReleaseJPerM2: number;
  /** Full cross-section cracks that the energy could pay for, dimensionless; an upper bound. */
  readonly crackCount: number;
};

const mpaPerGpa = 1000;
// 1 MPa·m is 1e6 J/m²
const joulesPerM2PerMPaM = 1e6;
// 1 J/m² is 1e-3 mJ/mm²
const mjPerMm2PerJPerM2 = 1e-3;

/**
 * Elastic energy stored in a bar at fracture, and how many cracks through the section it could pay for at most.
 * Method `energy.bar`. An inner span of 0 stands for three points.
 *
 * The count is an upper bound: most of the energy leaves as motion and sound. Shear and the ends beyond the rollers are left
 * out. Exact within beam theory; rounding only.
 * Source: M²/(2EI) integrated, U = (σ²bd/6E)[Li + (Lo − Li)/3]; G = K²(1 − ν²)/E; N = U/(Gbd).
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, poisson-out-of-range,
 * non-positive-toughness, outside-validity-range for the modulus, non-positive-span, negative-inner-span,
 * inner-span-not-less-than-outer, non-positive-stress
 * @example storedEnergy({ stressMPa: 600, modulusGPa: 310, widthMm: 4, depthMm: 3, outerSpanMm: 40, innerSpanMm: 20, toughnessMPaRootM: 4.5, poissonRatio: 0.27 }).energyMJ // 61.93…
 */
export function storedEnergy(bar: StressedBar): StoredEnergy {
  const { stressMPa, modulusGPa, widthMm, depthMm, outerSpanMm, innerSpanMm, toughnessMPaRootM, poissonRatio } = bar;
  requireFinite({ ...bar });
  requirePositive({ widthMm, depthMm }, 'non-positive-dimension');
  requirePoissonRatio({ poissonRatio });
  requirePositive({ toughnessMPaRootM }, 'non-positive-toughness');
  requirePositive({ modulusGPa }, 'outside-validity-range');
  requireFourPointSpans(bar);
  requirePositive({ stressMPa }, 'non-positive-stress');
  const modulusMPa = modulusGPa * mpaPerGpa;
  const bentMm = innerSpanMm + (outerSpanMm - innerSpanMm) / 3;
  // MPa·mm³ is N·mm, and so mJ
  const energyMJ = ((stressMPa ** 2 * widthMm * depthMm) / (6 * modulusMPa)) * bentMm;
  const energyReleaseJPerM2 = ((toughnessMPaRootM ** 2 * (1 - poissonRatio ** 2)) / modulusMPa) * joulesPerM2PerMPaM;
  const oneCrackMJ = energyReleaseJPerM2 * mjPerMm2PerJPerM2 * widthMm * depthMm;
  return { energyMJ, energyReleaseJPerM2, crackCount: energyMJ / oneCrackMJ };
}
