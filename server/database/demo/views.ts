import type { FractographView } from '#shared/vocabulary/fractographs.ts';
import type { Face } from '#shared/vocabulary/pieces.ts';
import { DEMO_SURFACES, type DemoSurface, type DemoView } from '../../imaging/synthetic-surface/demo-surfaces.ts';
import type { FractureSurfaceSpec } from '../../imaging/synthetic-surface/surface-spec.ts';
import { demoCalibrations, demoReplacement, type DemoCalibrationCode } from './calibrations.ts';
import type { DemoCase } from './demo-case.ts';

/** One fractograph of a demo case: what is drawn, and what is said of it. */
export type CaseView = {
  readonly figure: number;
  readonly fragment: string;
  readonly face: Face;
  readonly view: FractographView;
  readonly calibration: DemoCalibrationCode;
  readonly caption: string;
  readonly fileName: string;
  readonly format: 'png' | 'tiff';
  readonly spec: FractureSurfaceSpec;
};

const viewWords: Readonly<Record<DemoView, FractographView>> = {
  'whole-face': 'face',
  'origin-and-mirror': 'mirror',
  'origin-close': 'origin',
  'mating-face': 'mate',
};

/**
 * The fractographs of a case in the order of their figures. `pixelFactor` makes every pixel so many times larger, so that
 * a test draws smaller images of the same pieces; lengths in µm stay.
 */
export function viewsOf(told: DemoCase, pixelFactor: number): CaseView[] {
  return DEMO_SURFACES.filter(({ caseCode }) => caseCode === told.code).map((surface) => {
    const { instrument } = demoCalibrations.find(({ code }) => code === surface.calibration) ?? { instrument: '' };
    const format = instrument === 'Electron microscope' ? 'tiff' : 'png';
    return {
      figure: surface.order,
      fragment: surface.fragment,
      face: surface.face === 'first' ? 'A' : 'B',
      view:
        surface.spec.mirrorRadiusUm === null && surface.view === 'origin-and-mirror'
          ? 'origin'
          : viewWords[surface.view],
      calibration: surface.calibration,
      caption: surface.caption,
      fileName: `${told.code}-${surface.fragment}-${surface.order}-${surface.view}.${format}`,
      format,
      spec: withPixels(surface, trueSizeUm(told, surface) * pixelFactor),
    };
  });
}

/** An image taken after the scale was put right has the right pixel size from the beginning. */
function trueSizeUm(told: DemoCase, { calibration, spec }: DemoSurface): number {
  const isTakenLater = (told.examinedOn ?? '') >= demoReplacement.on;
  return calibration === demoReplacement.code && isTakenLater ? demoReplacement.pixelSizeUm : spec.pixelSizeUm;
}

function withPixels({ spec }: DemoSurface, pixelSizeUm: number): FractureSurfaceSpec {
  const factor = spec.pixelSizeUm / pixelSizeUm;
  return {
    ...spec,
    pixelSizeUm,
    widthPx: Math.round(spec.widthPx * factor),
    heightPx: Math.round(spec.heightPx * factor),
    origin: { xPx: spec.origin.xPx * factor, yPx: spec.origin.yPx * factor },
  };
}
