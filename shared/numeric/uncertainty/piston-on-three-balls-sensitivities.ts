import {
  pistonOnThreeBallsStress,
  printedConstant,
  type PistonOnThreeBallsDisc,
} from '../bending/piston-on-three-balls-stress.ts';

/**
 * Change of the piston-on-three-balls stress per unit of load (MPa/N), length (MPa/mm) and Poisson's ratio (MPa).
 * Source: derivatives of 0.2387 F (Y − X)/h². Refuses as `disc.pistonOnThreeBalls`.
 */
export function pistonOnThreeBallsSensitivities(disc: PistonOnThreeBallsDisc) {
  const { stressMPa } = pistonOnThreeBallsStress(disc);
  const unitMPa = (printedConstant * disc.loadN) / disc.thicknessMm ** 2;
  const { poissonRatio, supportRadiusMm: support, pistonRadiusMm: piston, discRadiusMm: whole } = disc;
  const circlesMm2 = support ** 2 - piston ** 2 / 2;
  return {
    load: pistonOnThreeBallsStress({ ...disc, loadN: 1 }).stressMPa,
    thickness: (-2 * stressMPa) / disc.thicknessMm,
    poisson: unitMPa * (1 + 2 * Math.log(support / piston) - circlesMm2 / whole ** 2),
    supportRadius: unitMPa * ((2 * (1 + poissonRatio)) / support + (2 * (1 - poissonRatio) * support) / whole ** 2),
    pistonRadius: -unitMPa * ((2 * (1 + poissonRatio)) / piston + ((1 - poissonRatio) * piston) / whole ** 2),
    discRadius: (-2 * unitMPa * (1 - poissonRatio) * circlesMm2) / whole ** 3,
  };
}
