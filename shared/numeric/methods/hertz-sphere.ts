import { sphereContact } from '../contact/sphere-contact.ts';
import { sphereContactSensitivities } from '../uncertainty/sphere-contact-sensitivities.ts';
import { contactInputs } from './contact-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';

const contact = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  radiusMm: numberGiven(given, 'radius'),
  sphereModulusGPa: numberGiven(given, 'E1'),
  spherePoissonRatio: numberGiven(given, 'nu1'),
  partModulusGPa: numberGiven(given, 'E2'),
  partPoissonRatio: numberGiven(given, 'nu2'),
});

const notAStrength: Caution = {
  code: 'no-bend-strength',
  weight: 'note',
  sentence:
    'The tension falls off within a few tenths of the contact radius in depth: do not compare it with a bend strength.',
};
const zeroLoad: Caution = {
  code: 'zero-load',
  weight: 'warning',
  sentence: 'The load is zero, so the stress is zero.',
};

export const hertzSphere: Method = {
  id: 'hertz.sphere',
  version: 1,
  line: 'supporting',
  title: 'Contact of a sphere with a flat part',
  inputs: [
    contactInputs.load,
    contactInputs.radius,
    contactInputs.sphereModulus,
    contactInputs.spherePoisson,
    contactInputs.partModulus,
    contactInputs.partPoisson,
  ],
  outputs: [
    { name: 'effectiveModulus', label: 'Effective modulus', symbol: 'E*', unit: 'GPa' },
    { name: 'contactRadius', label: 'Radius of the contact', symbol: 'a', unit: 'mm' },
    { name: 'peakPressure', label: 'Pressure in the middle', symbol: 'p₀', unit: 'MPa' },
    { name: 'edgeTensileStress', label: 'Tension at the edge of the contact', symbol: 'σ', unit: 'MPa' },
  ],
  mainOutput: 'edgeTensileStress',
  formula: {
    symbols: '(1 − 2ν₂)P / (2πa²), a³ = 3PR / (4E*)',
    template: () => '(1 − 2 × {nu2}) × {load} / (2π × a²), a³ = 3 × {load} × {radius} / (4 × E*)',
  },
  source: { text: 'Hertz, as in handbooks; elastic, smooth, without friction', tag: 'looked up' },
  run: (given) => {
    const stress = sphereContact(contact(given));
    return {
      effectiveModulus: stress.effectiveModulusGPa,
      contactRadius: stress.contactRadiusMm,
      peakPressure: stress.peakPressureMPa,
      edgeTensileStress: stress.edgeTensileStressMPa,
    };
  },
  sensitivities: (given) => sphereContactSensitivities(contact(given)),
  cautions: (given) => [notAStrength, ...(numberGiven(given, 'load') === 0 ? [zeroLoad] : [])],
};
