import type { DemoCalibration, DemoCaseCode, DemoPiece } from './demo-pieces.ts';
import { DEMO_PIECES, DEMO_PIXEL_SIZES_UM } from './demo-pieces.ts';
import type { FractureSurfaceSpec } from './surface-spec.ts';

export type DemoView = 'whole-face' | 'origin-and-mirror' | 'origin-close' | 'mating-face';

export type DemoSurface = {
  /** Last part of the case number, '0001' to '0012'. */ caseCode: DemoCaseCode;
  /** Place among the case's views, from 1. */ order: number;
  /** Fragment the face belongs to, 'F1'. */ fragment: string;
  view: DemoView;
  face: 'first' | 'mate';
  /** The scale the image was truly taken at. */ calibration: DemoCalibration;
  caption: string;
  spec: FractureSurfaceSpec;
};

/** fragment, view, calibration, width and height px, origin x and y px, scale bar µm, caption. */
type ViewRow = readonly [string, DemoView, DemoCalibration, number, number, number, number, number, string];

const VIEWS: Record<DemoCaseCode, readonly ViewRow[]> = {
  '0001': [
    ['F1', 'whole-face', 'CAL-01', 2000, 1560, 1120, 1440, 500, 'Whole face, tensile side down; curl at the far side'],
    [
      'F1',
      'origin-and-mirror',
      'CAL-06',
      2340,
      1420,
      1180,
      1300,
      200,
      'Origin and mirror; pore cut by the tensile surface',
    ],
    ['F1', 'origin-close', 'CAL-04', 1600, 1100, 800, 900, 20, 'Pore at the origin, grains on its wall'],
    ['F2', 'mating-face', 'CAL-06', 2340, 1420, 1160, 1300, 200, 'Mating face, the same pore'],
  ],
  '0002': [
    ['F1', 'whole-face', 'CAL-05', 1000, 740, 170, 600, 2000, 'Whole face of the ring, sealing side down'],
    ['F1', 'origin-and-mirror', 'CAL-01', 1800, 1400, 420, 1260, 1000, 'Mirror from the chipped edge'],
    ['F1', 'origin-close', 'CAL-03', 1600, 1100, 760, 930, 100, 'Chip at the edge, ribs round the place of contact'],
  ],
  '0003': [
    ['F1', 'whole-face', 'CAL-01', 2100, 1560, 980, 1310, 500, 'Whole face; the mirror takes most of the section'],
    ['F1', 'origin-and-mirror', 'CAL-02', 2400, 1500, 1190, 1090, 500, 'Agglomerate below the tensile surface'],
    ['F1', 'origin-close', 'CAL-03', 1500, 1120, 750, 540, 100, 'Agglomerate, parting round it'],
  ],
  '0004': [
    ['F1', 'whole-face', 'CAL-01', 2000, 1560, 950, 1350, 500, 'Whole face, tensile side down'],
    ['F1', 'origin-and-mirror', 'CAL-02', 1960, 1240, 990, 970, 500, 'Mirror, agglomerate and a pit at the surface'],
    ['F1', 'origin-close', 'CAL-03', 1700, 1200, 980, 680, 100, 'Agglomerate; the pit lies to its left'],
    ['F2', 'mating-face', 'CAL-02', 1960, 1240, 970, 970, 500, 'Mating face'],
  ],
  '0005': [
    ['F1', 'whole-face', 'CAL-05', 2240, 660, 940, 570, 2000, 'Whole face of the strip, tensile side down'],
    ['F1', 'origin-and-mirror', 'CAL-02', 2300, 1500, 1140, 1360, 500, 'Mirror with Wallner lines, mist, hackle'],
    ['F1', 'origin-close', 'CAL-03', 1600, 1100, 800, 960, 50, 'Surface crack at the origin'],
  ],
  '0006': [
    ['F1', 'whole-face', 'CAL-05', 1800, 1040, 860, 935, 2000, 'Fracture surface across the panel, origin at the foot'],
    ['F1', 'origin-and-mirror', 'CAL-06', 1600, 1200, 800, 1060, 100, 'Mirror from a scratch at the glass surface'],
    ['F1', 'origin-close', 'CAL-04', 1600, 1100, 800, 920, 20, 'Scratch seen end on'],
  ],
  '0007': [
    ['F1', 'whole-face', 'CAL-01', 1760, 1000, 780, 640, 500, 'Wall of the crown at F1, inner side down'],
    ['F1', 'origin-and-mirror', 'CAL-06', 1800, 1250, 900, 1080, 100, 'Origin and mirror at the ground inner surface'],
    ['F1', 'origin-close', 'CAL-04', 1600, 1100, 800, 900, 20, 'Short cracks side by side, stepped'],
    ['F2', 'mating-face', 'CAL-06', 1800, 1250, 900, 1080, 100, 'Mating face on F2'],
  ],
  '0008': [
    [
      'F1',
      'origin-and-mirror',
      'CAL-05',
      1700,
      1250,
      850,
      1070,
      5000,
      'Firing crack at the foot; the body shows no mirror',
    ],
    ['F2', 'mating-face', 'CAL-05', 1700, 1250, 850, 1070, 5000, 'Mating face; from here a slice was cut'],
  ],
  '0009': [
    ['F1', 'whole-face', 'CAL-01', 1800, 1350, 900, 1120, 500, 'Lower half of the face, origin near the surface'],
    ['F1', 'origin-and-mirror', 'CAL-03', 1600, 1200, 800, 880, 100, 'Pore close below the surface'],
    ['F1', 'origin-close', 'CAL-04', 1600, 1200, 800, 560, 20, 'Pore at the origin'],
  ],
  '0010': [
    ['F1', 'whole-face', 'CAL-01', 2000, 1560, 880, 1440, 500, 'Whole face, tensile side down; curl at the far side'],
    ['F1', 'origin-and-mirror', 'CAL-02', 1900, 1250, 950, 1100, 200, 'Origin and mirror'],
    ['F1', 'origin-close', 'CAL-03', 1600, 1100, 800, 930, 50, 'Pore at the tensile surface'],
  ],
  '0011': [
    ['F1', 'whole-face', 'CAL-01', 1500, 1120, 750, -2000, 500, 'Face of F1; grains and pores, no origin found'],
    ['F2', 'mating-face', 'CAL-01', 1500, 1120, 750, -2000, 500, 'Mating face of F2; no origin found'],
    ['F2', 'whole-face', 'CAL-01', 1500, 1120, 9000, -2000, 500, 'Second face of F2; no origin found'],
    ['F1', 'mating-face', 'CAL-01', 1500, 1120, 9000, -2000, 500, 'Second face of F1; no origin found'],
  ],
  '0012': [
    ['F1', 'whole-face', 'CAL-05', 1900, 1160, 930, 1070, 2000, 'Fracture surface through the glass, wetted side down'],
    [
      'F1',
      'origin-and-mirror',
      'CAL-06',
      3560,
      1340,
      300,
      1110,
      200,
      'Right half of the mirror, stitched from four fields',
    ],
    ['F1', 'origin-close', 'CAL-03', 1600, 1100, 800, 940, 100, 'Impact scratch at the origin'],
    ['F2', 'mating-face', 'CAL-01', 2000, 1300, 1000, 1160, 1000, 'Mating face, whole mirror'],
  ],
};

const DEMO_CASES = [
  '0001',
  '0002',
  '0003',
  '0004',
  '0005',
  '0006',
  '0007',
  '0008',
  '0009',
  '0010',
  '0011',
  '0012',
] as const satisfies readonly DemoCaseCode[];

function surfaceOf(caseCode: DemoCaseCode, row: ViewRow, place: number): DemoSurface {
  const [fragment, view, calibration, widthPx, heightPx, xPx, yPx, scaleBarUm, caption] = row;
  const piece: DemoPiece = DEMO_PIECES[caseCode];
  const face = view === 'mating-face' ? 'mate' : 'first';
  const pixelSizeUm = DEMO_PIXEL_SIZES_UM[calibration];
  const spec = { ...piece, widthPx, heightPx, pixelSizeUm, origin: { xPx, yPx }, scaleBarUm, face } as const;
  return { caseCode, order: place + 1, fragment, view, face, calibration, caption, spec };
}

/** All views of the twelve demo cases, by case, then in the order they were taken. */
export const DEMO_SURFACES: readonly DemoSurface[] = DEMO_CASES.flatMap((caseCode) =>
  VIEWS[caseCode].map((row, place) => surfaceOf(caseCode, row, place)),
);
