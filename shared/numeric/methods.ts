import { bendChamfer2 } from './methods/bend-chamfer2.ts';
import { bendChamfer4 } from './methods/bend-chamfer4.ts';
import { bendRound4 } from './methods/bend-round4.ts';
import { bend3RectLocal } from './methods/bend3-rect-local.ts';
import { bend3Rect } from './methods/bend3-rect.ts';
import { bend3RodLocal } from './methods/bend3-rod-local.ts';
import { bend3Rod } from './methods/bend3-rod.ts';
import { bend4RectLocal } from './methods/bend4-rect-local.ts';
import { bend4Rect } from './methods/bend4-rect.ts';
import { bend4RodLocalAngle } from './methods/bend4-rod-local-angle.ts';
import { bend4RodLocal } from './methods/bend4-rod-local.ts';
import { bend4Rod } from './methods/bend4-rod.ts';
import { cantileverRod } from './methods/cantilever-rod.ts';
import { comparePairCorrelated } from './methods/compare-pair-correlated.ts';
import { comparePair } from './methods/compare-pair.ts';
import { compareTriple } from './methods/compare-triple.ts';
import { discPistonOnThreeBallsLocal } from './methods/disc-piston-on-three-balls-local.ts';
import { discPistonOnThreeBalls } from './methods/disc-piston-on-three-balls.ts';
import { discRingOnRingLocal } from './methods/disc-ring-on-ring-local.ts';
import { discRingOnRing } from './methods/disc-ring-on-ring.ts';
import { energyBar } from './methods/energy-bar.ts';
import { errorFriction3 } from './methods/error-friction3.ts';
import { errorFriction4 } from './methods/error-friction4.ts';
import { errorLargeDeflection3 } from './methods/error-large-deflection3.ts';
import { errorWedging3 } from './methods/error-wedging3.ts';
import { errorWedging4 } from './methods/error-wedging4.ts';
import { flawApparentToughnessEmbedded } from './methods/flaw-apparent-toughness-embedded.ts';
import { flawEquivalentSemicircle } from './methods/flaw-equivalent-semicircle.ts';
import { flawPoreBracket } from './methods/flaw-pore-bracket.ts';
import { flawSizeSurfaceBending } from './methods/flaw-size-surface-bending.ts';
import { flawSize } from './methods/flaw-size.ts';
import { flawStress } from './methods/flaw-stress.ts';
import { gaugeConsistency4 } from './methods/gauge-consistency4.ts';
import { gaugeMeanMomentRatio3 } from './methods/gauge-mean-moment-ratio3.ts';
import { hertzSphereRadialDecay } from './methods/hertz-sphere-radial-decay.ts';
import { hertzSphere } from './methods/hertz-sphere.ts';
import { kPennyGradient } from './methods/k-penny-gradient.ts';
import { loadGiven } from './methods/load-given.ts';
import type { Method } from './methods/method.ts';
import { mirrorAverageRadiusEllipse } from './methods/mirror-average-radius-ellipse.ts';
import { mirrorAverageRadiusSurface } from './methods/mirror-average-radius-surface.ts';
import { mirrorFitIntercept } from './methods/mirror-fit-intercept.ts';
import { mirrorFitLoglog } from './methods/mirror-fit-loglog.ts';
import { mirrorFitMean } from './methods/mirror-fit-mean.ts';
import { mirrorFitOrigin } from './methods/mirror-fit-origin.ts';
import { mirrorFlawRatioBand } from './methods/mirror-flaw-ratio-band.ts';
import { mirrorFlawRatio } from './methods/mirror-flaw-ratio.ts';
import { mirrorGradientFactor } from './methods/mirror-gradient-factor.ts';
import { mirrorRadius } from './methods/mirror-radius.ts';
import { mirrorResidual } from './methods/mirror-residual.ts';
import { mirrorStress } from './methods/mirror-stress.ts';
import { mirrorUncertainty } from './methods/mirror-uncertainty.ts';
import { modulusGauge4 } from './methods/modulus-gauge4.ts';
import { modulusShearFactor3 } from './methods/modulus-shear-factor3.ts';
import { modulusSlope3 } from './methods/modulus-slope3.ts';
import { modulusSlope4Loadpoint } from './methods/modulus-slope4-loadpoint.ts';
import { modulusSlope4Midspan } from './methods/modulus-slope4-midspan.ts';
import { originCodeParse } from './methods/origin-code-parse.ts';
import { plateSupportedPressure } from './methods/plate-supported-pressure.ts';
import { scgApparentToughness } from './methods/scg-apparent-toughness.ts';
import { scgFullConstantRate } from './methods/scg-full-constant-rate.ts';
import { scgRateCorrection } from './methods/scg-rate-correction.ts';
import { scgStaticLife } from './methods/scg-static-life.ts';
import { strainDeflection3 } from './methods/strain-deflection3.ts';
import { strainDeflection4Loadpoint } from './methods/strain-deflection4-loadpoint.ts';
import { strainDeflection4Midspan } from './methods/strain-deflection4-midspan.ts';
import { strainDeflection4Relative } from './methods/strain-deflection4-relative.ts';
import { strainRateCrosshead3 } from './methods/strain-rate-crosshead3.ts';
import { strainRateCrosshead4 } from './methods/strain-rate-crosshead4.ts';
import { thermalPlateBiot } from './methods/thermal-plate-biot.ts';
import { thermalPlateInstant } from './methods/thermal-plate-instant.ts';
import { thermalPsi } from './methods/thermal-psi.ts';
import { validityBreakLocation4 } from './methods/validity-break-location4.ts';
import { validitySpecimen } from './methods/validity-specimen.ts';
import { yCornerNewmanRaju } from './methods/y-corner-newman-raju.ts';
import { yEdgeBending } from './methods/y-edge-bending.ts';
import { yEdgeTension } from './methods/y-edge-tension.ts';
import { yEmbeddedEllipse } from './methods/y-embedded-ellipse.ts';
import { yEmbeddedNewmanRaju } from './methods/y-embedded-newman-raju.ts';
import { yEmbeddedQApprox } from './methods/y-embedded-q-approx.ts';
import { ySurfaceNewmanRaju } from './methods/y-surface-newman-raju.ts';

/** Every method that can be run, all versions of each. A changed formula is one more entry; none is ever taken out. */
export const methods: readonly Method[] = [
  bend4Rect,
  bend4RectLocal,
  bend3Rect,
  bend3RectLocal,
  bend4Rod,
  bend4RodLocal,
  bend4RodLocalAngle,
  bend3Rod,
  bend3RodLocal,
  cantileverRod,
  discRingOnRing,
  discRingOnRingLocal,
  discPistonOnThreeBalls,
  discPistonOnThreeBallsLocal,
  plateSupportedPressure,
  loadGiven,
  bendChamfer4,
  bendChamfer2,
  bendRound4,
  strainDeflection3,
  strainDeflection4Midspan,
  strainDeflection4Loadpoint,
  strainDeflection4Relative,
  strainRateCrosshead3,
  strainRateCrosshead4,
  modulusSlope3,
  modulusSlope4Loadpoint,
  modulusSlope4Midspan,
  modulusShearFactor3,
  modulusGauge4,
  gaugeMeanMomentRatio3,
  gaugeConsistency4,
  errorFriction4,
  errorFriction3,
  errorLargeDeflection3,
  errorWedging3,
  errorWedging4,
  validitySpecimen,
  validityBreakLocation4,
  energyBar,
  mirrorStress,
  mirrorRadius,
  mirrorResidual,
  mirrorAverageRadiusSurface,
  mirrorAverageRadiusEllipse,
  mirrorUncertainty,
  mirrorFlawRatio,
  mirrorFlawRatioBand,
  mirrorGradientFactor,
  mirrorFitOrigin,
  mirrorFitMean,
  mirrorFitIntercept,
  mirrorFitLoglog,
  flawStress,
  ySurfaceNewmanRaju,
  yCornerNewmanRaju,
  yEmbeddedEllipse,
  yEmbeddedQApprox,
  yEmbeddedNewmanRaju,
  yEdgeBending,
  yEdgeTension,
  comparePair,
  comparePairCorrelated,
  compareTriple,
  originCodeParse,
  flawSize,
  flawSizeSurfaceBending,
  flawApparentToughnessEmbedded,
  kPennyGradient,
  flawEquivalentSemicircle,
  flawPoreBracket,
  scgRateCorrection,
  scgFullConstantRate,
  scgStaticLife,
  scgApparentToughness,
  thermalPlateInstant,
  thermalPlateBiot,
  thermalPsi,
  hertzSphere,
  hertzSphereRadialDecay,
];

/** The method of that id and version, or nothing. */
export function findMethod(id: string, version: number): Method | undefined {
  return methods.find((method) => method.id === id && method.version === version);
}

/** The newest version of a method, for a new estimate; nothing for an unknown id. */
export function findCurrentMethod(id: string): Method | undefined {
  return methods
    .filter((method) => method.id === id)
    .sort((one, other) => other.version - one.version)
    .at(0);
}
