import { gaugeAgainstBeam } from '../bending/gauge-against-beam.ts';
import { gaugeCautions } from './check-cautions.ts';
import { checkInputs } from './check-inputs.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';

const bar = (given: GivenInputs) => ({
  loadN: numberGiven(given, 'load'),
  outerSpanMm: numberGiven(given, 'outerSpan'),
  innerSpanMm: numberGiven(given, 'innerSpan'),
  widthMm: numberGiven(given, 'width'),
  depthMm: numberGiven(given, 'depth'),
  gaugeStrain: numberGiven(given, 'gaugeStrain'),
  modulusGPa: numberGiven(given, 'modulus'),
});

export const gaugeConsistency4: Method = {
  id: 'gauge.consistency4',
  version: 1,
  line: 'supporting',
  title: 'Four-point bar: strain gauge against load',
  inputs: [
    checkInputs.load,
    checkInputs.outerSpan,
    checkInputs.innerSpan,
    checkInputs.width,
    checkInputs.depth,
    checkInputs.gaugeStrain,
    checkInputs.modulus,
  ],
  outputs: [
    { name: 'gaugeStress', label: 'Stress by the gauge', symbol: 'Eε', unit: 'MPa' },
    { name: 'beamStress', label: 'Stress by the load', symbol: 'σ', unit: 'MPa' },
    { name: 'ratio', label: 'Gauge over load', symbol: 'Eε/σ', unit: '1' },
  ],
  mainOutput: 'ratio',
  formula: {
    symbols: 'Eε / [3F(L − l) / 2bd²]',
    template: () =>
      '{modulus} × {gaugeStrain} / [3 × {load} × ({outerSpan#} − {innerSpan#}) mm / (2 × {width} × ({depth})²)]',
  },
  source: { text: 'Beam theory; limits from trade practice', tag: 'practice' },
  run: (given) => {
    const { gaugeStressMPa, beamStressMPa, ratio } = gaugeAgainstBeam(bar(given));
    return { gaugeStress: gaugeStressMPa, beamStress: beamStressMPa, ratio };
  },
  cautions: (_given, outputs) => gaugeCautions(outputs),
};
