import { requireFinite, requireNotNegative, requirePositive, requireThat } from '../require.ts';

const mpaPerGpa = 1000;

export type SphereContact = {
  /** Contact load, N, ≥ 0. */
  readonly loadN: number;
  /** Radius of the sphere, mm, > 0; against another sphere 1/R = 1/R₁ + 1/R₂. */
  readonly radiusMm: number;
  /** Modulus of the sphere, GPa, > 0. */
  readonly sphereModulusGPa: number;
  /** Poisson's ratio of the sphere, 0 to below 0.5. */
  readonly spherePoissonRatio: number;
  /** Modulus of the part, GPa, > 0. */
  readonly partModulusGPa: number;
  /** Poisson's ratio of the part, 0 to below 0.5. */
  readonly partPoissonRatio: number;
};

export type ContactStress = {
  /** E*, GPa. */
  readonly effectiveModulusGPa: number;
  /** Radius of the contact, mm, ≥ 0. */
  readonly contactRadiusMm: number;
  /** Pressure in the middle, MPa, ≥ 0. */
  readonly peakPressureMPa: number;
  /** Largest tension, at the edge of the contact on the part, MPa, ≥ 0. */
  readonly edgeTensileStressMPa: number;
};

/**
 * Contact of a sphere with a flat part. Method `hertz.sphere`.
 *
 * Holds for elastic, smooth bodies without friction and a contact small against the radius. The tension falls off within a
 * few tenths of the contact radius in depth, so it may not be compared with a bend strength. Rounding only.
 * Source: Hertz: 1/E* = (1−ν₁²)/E₁ + (1−ν₂²)/E₂, a³ = 3PR/(4E*), p₀ = 3P/(2πa²), sigma = (1−2ν₂) p₀/3.
 * @throws OutsideDomain, the first that applies: non-finite-input, non-positive-dimension, outside-validity-range (E ≤ 0),
 * poisson-out-of-range, negative-load
 * @example sphereContact({ loadN: 100, radiusMm: 2.5, sphereModulusGPa: 600, spherePoissonRatio: 0.22, partModulusGPa: 70, partPoissonRatio: 0.22 }).edgeTensileStressMPa // 443.76…
 */
export function sphereContact(contact: SphereContact): ContactStress {
  requireSphereContact(contact);
  const { loadN, radiusMm, partPoissonRatio } = contact;
  const effectiveModulusGPa = 1 / (compliance(contact, 'sphere') + compliance(contact, 'part'));
  const effectiveModulusMPa = effectiveModulusGPa * mpaPerGpa;
  const contactRadiusMm = Math.cbrt((3 * loadN * radiusMm) / (4 * effectiveModulusMPa));
  // p₀ with the radius of the contact put in, so that no load gives 0
  const peakPressureMPa = Math.cbrt((6 * loadN * effectiveModulusMPa ** 2) / radiusMm ** 2) / Math.PI;
  const edgeTensileStressMPa = ((1 - 2 * partPoissonRatio) * peakPressureMPa) / 3;
  return { effectiveModulusGPa, contactRadiusMm, peakPressureMPa, edgeTensileStressMPa };
}

/** (1 − ν²)/E of one body, 1/GPa. */
function compliance(contact: SphereContact, body: 'sphere' | 'part'): number {
  return (1 - contact[`${body}PoissonRatio`] ** 2) / contact[`${body}ModulusGPa`];
}

function requireSphereContact(contact: SphereContact): void {
  const { loadN, radiusMm, sphereModulusGPa, spherePoissonRatio, partModulusGPa, partPoissonRatio } = contact;
  requireFinite({ loadN, radiusMm, sphereModulusGPa, spherePoissonRatio, partModulusGPa, partPoissonRatio });
  requirePositive({ radiusMm }, 'non-positive-dimension');
  requirePositive({ sphereModulusGPa, partModulusGPa }, 'outside-validity-range');
  for (const [field, ratio] of Object.entries({ spherePoissonRatio, partPoissonRatio }))
    requireThat(ratio >= 0 && ratio < 0.5, 'poisson-out-of-range', field);
  requireNotNegative({ loadN }, 'negative-load');
}
