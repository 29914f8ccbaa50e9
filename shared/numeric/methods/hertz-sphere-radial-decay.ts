import { contactStressOutsideMPa } from '../contact/contact-stress-outside.ts';
import { contactInputs } from './contact-inputs.ts';
import { numberGiven } from './given.ts';
import type { Method } from './method.ts';

export const hertzSphereRadialDecay: Method = {
  id: 'hertz.sphere.radialDecay',
  version: 1,
  line: 'supporting',
  title: 'Radial stress on the surface outside a contact',
  inputs: [contactInputs.edgeStress, contactInputs.contactRadius, contactInputs.distance],
  outputs: [{ name: 'radialStress', label: 'Radial stress there', symbol: 'σr', unit: 'MPa' }],
  mainOutput: 'radialStress',
  formula: { symbols: 'σ(a/r)²', template: () => '{edgeTensileStress} × ({contactRadius} / {r})²' },
  source: { text: 'Hertz, on the surface outside the contact', tag: 're-derived' },
  run: (given) => ({
    radialStress: contactStressOutsideMPa({
      edgeTensileStressMPa: numberGiven(given, 'edgeTensileStress'),
      contactRadiusMm: numberGiven(given, 'contactRadius'),
      distanceMm: numberGiven(given, 'r'),
    }),
  }),
  cautions: () => [],
};
