import { embeddedApparentToughness } from '../fracture/embedded-apparent-toughness.ts';
import { flawCover } from '../fracture/flaw-cover.ts';
import { embeddedToughnessSensitivities } from '../uncertainty/embedded-toughness-sensitivities.ts';
import { position4Cautions, sectionCautions, slenderness4Cautions } from './bar-cautions.ts';
import { barInputs } from './bar-inputs.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven } from './given.ts';
import type { Caution, GivenInputs, Method } from './method.ts';

const flaw = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  xMm: numberGiven(given, 'x'),
  yMm: numberGiven(given, 'y'),
  flawRadiusMm: numberGiven(given, 'a'),
});

function coverCautions(given: GivenInputs): Caution[] {
  const { treatedAs } = flawCover({ centreDepthMm: numberGiven(given, 'y'), halfAxisMm: numberGiven(given, 'a') });
  if (treatedAs === 'interior') return [];
  const sentence =
    'The flaw is closer to the face than half its radius: treat it as a surface flaw of the shape that encloses it.';
  return [{ code: 'flaw-near-surface', weight: 'warning', sentence }];
}

export const flawApparentToughnessEmbedded: Method = {
  id: 'flaw.apparentToughness.embedded',
  version: 1,
  line: 'supporting',
  title: 'Apparent toughness of a round flaw inside a four-point bar',
  inputs: [
    barInputs.load,
    barInputs.outerSpan,
    barInputs.innerSpan,
    barInputs.width,
    barInputs.depth,
    barInputs.x,
    { ...barInputs.y, label: 'Centre of the flaw below the tensile face' },
    { ...flawInputs.radius, argument: 'flawRadiusMm', uncertainty: 'expected' },
  ],
  outputs: [
    { name: 'localStress', label: 'Stress at the centre of the flaw', symbol: 'σ', unit: 'MPa' },
    { name: 'apparentKIc', label: 'Apparent toughness', symbol: 'Kapp', unit: 'MPa√m' },
  ],
  mainOutput: 'apparentKIc',
  formula: { symbols: '(2/√π)·σ(x, y)·√a', template: () => '2 / √π × σ({x}, {y}) × √({a@m})' },
  source: { text: 'Penny crack, Y = 2/√π, with the beam stress at its centre', tag: 're-derived' },
  run: (given) => {
    const { localStressMPa, apparentToughnessMPaRootM } = embeddedApparentToughness(flaw(given));
    return { localStress: localStressMPa, apparentKIc: apparentToughnessMPaRootM };
  },
  sensitivities: (given) => embeddedToughnessSensitivities(flaw(given)),
  cautions: (given) => [
    ...coverCautions(given),
    ...sectionCautions(given),
    ...slenderness4Cautions(given),
    ...position4Cautions(given),
  ],
};
