import { sphereContact, type SphereContact } from '../contact/sphere-contact.ts';
import { requireThat } from '../require.ts';

/**
 * Change of the edge stress of a contact per unit of load (MPa/N), radius (MPa/mm), moduli (MPa/GPa) and Poisson's ratios
 * (MPa).
 * Source: exponents 1/3 of the load, −2/3 of the radius, 2/3 of E*, and −2/(1 − 2ν₂) beside it.
 * Refuses as `hertz.sphere`, and no load as outside-validity-range, since the slope has no end there.
 */
export function sphereContactSensitivities(contact: SphereContact) {
  const { effectiveModulusGPa, edgeTensileStressMPa: stressMPa } = sphereContact(contact);
  const { loadN, radiusMm, sphereModulusGPa, spherePoissonRatio, partModulusGPa, partPoissonRatio } = contact;
  requireThat(loadN > 0, 'outside-validity-range', 'loadN');
  // ∂E*/∂E = E*² (1 − ν²)/E² and ∂E*/∂ν = E*² 2ν/E, for either body
  const perCompliance = (2 / 3) * stressMPa * effectiveModulusGPa;
  return {
    load: stressMPa / (3 * loadN),
    radius: (-2 * stressMPa) / (3 * radiusMm),
    E1: (perCompliance * (1 - spherePoissonRatio ** 2)) / sphereModulusGPa ** 2,
    nu1: (perCompliance * 2 * spherePoissonRatio) / sphereModulusGPa,
    E2: (perCompliance * (1 - partPoissonRatio ** 2)) / partModulusGPa ** 2,
    nu2: (perCompliance * 2 * partPoissonRatio) / partModulusGPa - (2 * stressMPa) / (1 - 2 * partPoissonRatio),
  };
}
