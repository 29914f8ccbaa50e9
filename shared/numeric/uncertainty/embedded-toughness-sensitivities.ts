import { embeddedApparentToughness, type FlawInFourPointBar } from '../fracture/embedded-apparent-toughness.ts';
import { fourPointLocalSensitivities } from './four-point-local-sensitivities.ts';

/**
 * Change of the apparent toughness of a round flaw in a four-point bar per unit of each input, MPa√m per N or mm.
 * Source: the sensitivities of the local stress times Y√a, and K/(2a). Refuses as `flaw.apparentToughness.embedded`.
 */
export function embeddedToughnessSensitivities(flaw: FlawInFourPointBar) {
  const { localStressMPa, apparentToughnessMPaRootM } = embeddedApparentToughness(flaw);
  const { flawRadiusMm, ...bar } = flaw;
  const perStress = apparentToughnessMPaRootM / localStressMPa;
  const ofStress = fourPointLocalSensitivities(bar);
  return {
    load: ofStress.load * perStress,
    outerSpan: ofStress.outerSpan * perStress,
    innerSpan: ofStress.innerSpan * perStress,
    width: ofStress.width * perStress,
    depth: ofStress.depth * perStress,
    x: ofStress.x * perStress,
    y: ofStress.y * perStress,
    a: apparentToughnessMPaRootM / (2 * flawRadiusMm),
  };
}
