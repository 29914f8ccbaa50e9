import { plateCooledStress } from '../thermal/plate-cooled-stress.ts';
import { plateCooledSensitivities } from '../uncertainty/thermal-sensitivities.ts';
import { numberGiven } from './given.ts';
import type { GivenInputs, Method } from './method.ts';
import { biotCautions, heatingCautions, thermalInputs } from './thermal-inputs.ts';

const plate = (given: GivenInputs) => ({
  modulusGPa: numberGiven(given, 'E'),
  expansionPerK: numberGiven(given, 'alpha'),
  temperatureDropK: numberGiven(given, 'deltaT'),
  poissonRatio: numberGiven(given, 'poisson'),
  heatTransferWPerM2K: numberGiven(given, 'h'),
  halfThicknessMm: numberGiven(given, 'halfThickness'),
  conductivityWPerMK: numberGiven(given, 'conductivity'),
});

export const thermalPlateBiot: Method = {
  id: 'thermal.plateBiot',
  version: 1,
  line: 'supporting',
  title: 'Stress of a face cooled by a fluid, an upper estimate',
  inputs: [
    thermalInputs.modulus,
    thermalInputs.expansion,
    thermalInputs.drop,
    thermalInputs.poisson,
    thermalInputs.heatTransfer,
    thermalInputs.halfThickness,
    thermalInputs.conductivity,
  ],
  outputs: [
    { name: 'biot', label: 'Biot number', symbol: 'Bi', unit: '1' },
    { name: 'psi', label: 'Part of the stress of instant cooling', symbol: 'ψ', unit: '1' },
    { name: 'stress', label: 'Largest stress in the face', symbol: 'σ', unit: 'MPa' },
  ],
  mainOutput: 'stress',
  formula: {
    symbols: 'ψ(Bi)·EαΔT / (1 − ν), Bi = hs/k',
    template: () => 'ψ × {E} × {alpha} × {deltaT} / (1 − {poisson}), Bi = {h} × {halfThickness@m} / {conductivity}',
  },
  source: {
    text: 'Fit within 5 % of the conduction series of the infinite plate for 0.1 ≤ Bi ≤ 50',
    tag: 'from memory',
  },
  run: (given) => {
    const { biotNumber, peakFactor, stressMPa } = plateCooledStress(plate(given));
    return { biot: biotNumber, psi: peakFactor, stress: stressMPa };
  },
  sensitivities: (given) => plateCooledSensitivities(plate(given)),
  cautions: (given, outputs) => [...heatingCautions(numberGiven(given, 'deltaT')), ...biotCautions(outputs.biot)],
};
