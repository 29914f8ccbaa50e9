import { bend3RectLocal } from './methods/bend3-rect-local.ts';
import { bend3Rect } from './methods/bend3-rect.ts';
import { bend4RectLocal } from './methods/bend4-rect-local.ts';
import { bend4Rect } from './methods/bend4-rect.ts';
import { flawStress } from './methods/flaw-stress.ts';
import type { Method } from './methods/method.ts';
import { mirrorAverageRadiusEllipse } from './methods/mirror-average-radius-ellipse.ts';
import { mirrorAverageRadiusSurface } from './methods/mirror-average-radius-surface.ts';
import { mirrorFitIntercept } from './methods/mirror-fit-intercept.ts';
import { mirrorFitLoglog } from './methods/mirror-fit-loglog.ts';
import { mirrorFitMean } from './methods/mirror-fit-mean.ts';
import { mirrorFitOrigin } from './methods/mirror-fit-origin.ts';
import { mirrorFlawRatioBand } from './methods/mirror-flaw-ratio-band.ts';
import { mirrorFlawRatio } from './methods/mirror-flaw-ratio.ts';
import { mirrorRadius } from './methods/mirror-radius.ts';
import { mirrorResidual } from './methods/mirror-residual.ts';
import { mirrorStress } from './methods/mirror-stress.ts';
import { mirrorUncertainty } from './methods/mirror-uncertainty.ts';

/** Every method that can be run, all versions of each. A changed formula is one more entry; none is ever taken out. */
export const methods: readonly Method[] = [
  bend4Rect,
  bend4RectLocal,
  bend3Rect,
  bend3RectLocal,
  mirrorStress,
  mirrorRadius,
  mirrorResidual,
  mirrorAverageRadiusSurface,
  mirrorAverageRadiusEllipse,
  mirrorUncertainty,
  mirrorFlawRatio,
  mirrorFlawRatioBand,
  mirrorFitOrigin,
  mirrorFitMean,
  mirrorFitIntercept,
  mirrorFitLoglog,
  flawStress,
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
