import type { FractureSurfaceSpec } from './surface-spec.ts';

/** Image scales of the demo laboratory, µm a pixel. */
export const DEMO_PIXEL_SIZES_UM = {
  'CAL-01': 2.2,
  'CAL-02': 1.1,
  'CAL-03': 0.496,
  'CAL-04': 0.124,
  'CAL-05': 12,
  'CAL-06': 0.55,
} as const;

export type DemoCalibration = keyof typeof DEMO_PIXEL_SIZES_UM;

/** What a case's broken piece is, however it is looked at. */
export type DemoPiece = Omit<FractureSurfaceSpec, 'widthPx' | 'heightPx' | 'pixelSizeUm' | 'origin' | 'scaleBarUm'>;

const STAGE_UM = DEMO_PIXEL_SIZES_UM['CAL-06'];

/** Section of a bend bar, µm, with its origin a given way from the left edge. */
const bar = (widthUm: number, heightUm: number, leftUm: number) => ({
  section: { heightUm, leftUm, rightUm: widthUm - leftUm, cornerUm: 0 },
  curlUm: heightUm * 0.11,
});

const round = (halfAxisUm: number) => ({ halfAxisDepthUm: halfAxisUm, halfAxisAlongUm: halfAxisUm });

/** The pieces of the twelve demo cases; radii and half-axes are those their estimates are read from. */
export const DEMO_PIECES = {
  '0001': {
    seed: 1001,
    originDepthUm: 0,
    flaw: { kind: 'pore', ...round(116.4 * STAGE_UM) },
    mirrorRadiusUm: 1018 * STAGE_UM,
    body: 'fine',
    ...bar(4010, 3000, 2280),
  },
  '0002': {
    seed: 1002,
    originDepthUm: 0,
    flaw: { kind: 'edge-chip', ...round(215) },
    mirrorRadiusUm: 1880,
    body: 'fine',
    section: { heightUm: 6000, leftUm: 420, rightUm: 8600, cornerUm: 180 },
    arrestRadiusUm: 5200,
  },
  '0003': {
    seed: 1003,
    originDepthUm: 300,
    flaw: { kind: 'agglomerate', ...round(195) },
    mirrorRadiusUm: 1950,
    mistRatio: 1.22,
    body: 'fine',
    ...bar(4030, 2980, 1850),
  },
  '0004': {
    seed: 2104,
    originDepthUm: 180,
    flaw: { kind: 'agglomerate', ...round(115) },
    // the pit that misled the first reader
    bystanders: [{ kind: 'pit', ...round(36), alongUm: -235, depthUm: 0 }],
    mirrorRadiusUm: 930,
    body: 'fine',
    ...bar(4010, 2990, 1720),
  },
  '0005': {
    seed: 1005,
    originDepthUm: 0,
    flaw: { kind: 'surface-crack', ...round(86.4 * DEMO_PIXEL_SIZES_UM['CAL-02']) },
    mirrorRadiusUm: 890.9 * DEMO_PIXEL_SIZES_UM['CAL-02'],
    mistRatio: 1.28,
    body: 'glass',
    wallner: 0.8,
    section: { heightUm: 5850, leftUm: 10400, rightUm: 14600, cornerUm: 0 },
    curlUm: 500,
  },
  '0006': {
    seed: 1006,
    originDepthUm: 0,
    flaw: { kind: 'impact-scratch', ...round(30.5) },
    mirrorRadiusUm: 262,
    mistRatio: 1.3,
    body: 'glass',
    wallner: 0.6,
    section: { heightUm: 10000, leftUm: 140000, rightUm: 220000, cornerUm: 0 },
  },
  '0007': {
    seed: 1007,
    originDepthUm: 0,
    flaw: { kind: 'grinding-crack', ...round(49) },
    mirrorRadiusUm: 345,
    body: 'fine',
    tensileCurveRadiusUm: 5200,
    section: { heightUm: 1250, leftUm: 1500, rightUm: 1900, cornerUm: 0 },
  },
  '0008': {
    seed: 1008,
    originDepthUm: 0,
    flaw: { kind: 'surface-crack', halfAxisDepthUm: 3200, halfAxisAlongUm: 3550 },
    mirrorRadiusUm: null,
    body: 'coarse',
    tensileCurveRadiusUm: 55000,
  },
  '0009': {
    seed: 1009,
    originDepthUm: 74,
    flaw: { kind: 'pore', ...round(16) },
    mirrorRadiusUm: null,
    body: 'fine',
    tensileCurveRadiusUm: 4000,
  },
  '0010': {
    seed: 1010,
    originDepthUm: 0,
    flaw: { kind: 'pore', ...round(66) },
    mirrorRadiusUm: 690,
    body: 'fine',
    ...bar(3990, 3000, 1560),
  },
  '0011': { seed: 1011, originDepthUm: 9000, flaw: null, mirrorRadiusUm: null, body: 'porous' },
  '0012': {
    seed: 1012,
    originDepthUm: 0,
    flaw: { kind: 'impact-scratch', ...round(312.7 * STAGE_UM) },
    mirrorRadiusUm: 3091 * STAGE_UM,
    mistRatio: 1.25,
    body: 'glass',
    wallner: 0.9,
    section: { heightUm: 12000, leftUm: 33000, rightUm: 47000, cornerUm: 0 },
  },
} as const satisfies Record<string, DemoPiece>;

export type DemoCaseCode = keyof typeof DEMO_PIECES;
