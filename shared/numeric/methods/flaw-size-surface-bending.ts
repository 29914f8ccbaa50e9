import { surfaceFlawSizeInBending } from '../fracture/surface-flaw-size-bending.ts';
import { statedRangeCautions } from './crack-cautions.ts';
import { crackInputs } from './crack-inputs.ts';
import { flawInputs } from './flaw-inputs.ts';
import { numberGiven, optionalNumberGiven } from './given.ts';
import type { Method } from './method.ts';

export const flawSizeSurfaceBending: Method = {
  id: 'flaw.size.surface.bending',
  version: 1,
  line: 'supporting',
  title: 'Depth of the surface flaw to look for in a bent bar',
  inputs: [
    flawInputs.KIc,
    { ...flawInputs.stress, label: 'Outer-fibre stress', limits: 'more than 0; at that place along the bar' },
    flawInputs.shape,
    crackInputs.thickness,
    crackInputs.halfWidth,
  ],
  outputs: [
    { name: 'a', label: 'Depth of the flaw', symbol: 'a', unit: 'mm' },
    { name: 'Ymax', label: 'Largest shape factor on its front', symbol: 'Ymax', unit: '1' },
  ],
  mainOutput: 'a',
  formula: {
    symbols: 'Ymax(a)·σ·√a = KIc at constant a/c',
    template: () => 'Ymax(a) × {stress} × √a = {KIc} at a/c = {aOverC}',
  },
  source: { text: 'Newman and Raju’s surface crack in bending, solved for the depth', tag: 're-derived' },
  run: (given) => {
    const { depthMm, shapeFactor } = surfaceFlawSizeInBending({
      toughnessMPaRootM: numberGiven(given, 'KIc'),
      stressMPa: numberGiven(given, 'stress'),
      depthOverHalfLength: numberGiven(given, 'aOverC'),
      thicknessMm: numberGiven(given, 't'),
      halfWidthMm: optionalNumberGiven(given, 'halfWidth'),
    });
    return { a: depthMm, Ymax: shapeFactor };
  },
  cautions: (given, outputs) => {
    const depth = typeof outputs.a === 'number' ? outputs.a / numberGiven(given, 't') : 0;
    return statedRangeCautions(numberGiven(given, 'aOverC'), depth);
  },
};
