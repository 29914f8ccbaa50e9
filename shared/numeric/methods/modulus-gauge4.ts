import { gaugeModulus } from '../bending/gauge-modulus.ts';
import { sectionCautions } from './bar-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { checkOutputs } from './check-outputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  gaugeStrain: numberGiven(given, 'gaugeStrain'),
});

export const modulusGauge4: Method = {
  id: 'modulus.gauge4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: modulus from a strain gauge',
  inputs: [
    checkInputs.load,
    checkInputs.outerSpan,
    checkInputs.innerSpan,
    checkInputs.width,
    checkInputs.depth,
    checkInputs.gaugeStrain,
  ],
  outputs: [{ name: 'stress', label: 'Stress under the gauge', symbol: 'σ', unit: 'MPa' }, checkOutputs.modulus],
  mainOutput: 'modulus',
  formula: {
    symbols: '3F(L − l) / 2bd²ε',
    template: () => '3 × {load} × ({outerSpan#} − {innerSpan#}) mm / (2 × {width} × ({depth})² × {gaugeStrain})',
  },
  source: { text: 'Beam theory; the gauge wholly within the inner span, on the tensile face', tag: 're-derived' },
  run: (given) => {
    const { stressMPa, modulusGPa } = gaugeModulus(bar(given));
    return { stress: stressMPa, modulus: modulusGPa };
  },
  cautions: sectionCautions,
};
