import type { CaseKind, Standing, Urgency } from '#shared/vocabulary/case-states.ts';
import type { Certainty } from '#shared/vocabulary/certainties.ts';
import type { MirrorBoundary } from '#shared/vocabulary/mirror-boundaries.ts';
import type { OriginCode } from '#shared/vocabulary/origin-codes.ts';
import type { OriginLies } from '#shared/vocabulary/pieces.ts';
import type { DemoCaseCode } from '../../imaging/synthetic-surface/demo-pieces.ts';
import type { DemoCalibrationCode } from './calibrations.ts';
import type { DemoMaterialName } from './materials.ts';
import type { DemoMail, DemoOrganisation } from './people.ts';

export type DemoPiece = {
  description: string;
  massText?: string;
  place: string;
  /** Set for a piece that is not there. */
  missing?: { reason: string; originLies: OriginLies };
};

/** How the face in Fig. `figure` is marked. Points come from the known truth of the drawn surface. */
export type DemoReading = {
  figure: number;
  by: DemoMail;
  originCode: OriginCode;
  certainty: Certainty;
  /** Absent where the body shows no mirror. */
  boundary?: MirrorBoundary;
  /** Place of the flaw, for its outline. */
  place: 'surface' | 'near surface' | 'interior' | 'edge';
  flawShape: 'half-ellipse' | 'ellipse' | 'quarter-ellipse' | 'irregular';
  note?: string;
  /** The scale bound to it; the one the image was truly taken at unless told. */
  boundTo?: DemoCalibrationCode;
  /** Marks the surface pit that misled the first reader, instead of the true origin. */
  ofBystander?: true;
  /** Radius drawn, µm, where this reader set it otherwise than it truly is. */
  mirrorRadiusUm?: number;
};

export type TypedInput = { text: string; standardUncertainty: string };

/** What the load line is worked from: a four-point bar, at the outer fibre or at a depth below it. */
export type DemoLoad = {
  method: 'bend4.rect' | 'bend4.rect.local';
  inputs: Record<string, TypedInput>;
};

/** One round of estimates; a later one stands in for the earlier ones of the same lines. */
export type DemoEstimates = {
  /** Which of the readings, from 0; absent where nothing is read from an image. */
  reading?: number;
  load?: DemoLoad;
  mirror?: { radiusPercent: number };
  flaw?: { shapeFactor: string; shapeFactorPercent: number; sizePercent: number };
  remark?: string;
};

export type DemoEnd = 'examining' | 'drafting' | 'in review' | 'closed';

export type DemoCase = {
  code: DemoCaseCode;
  title: string;
  summary: string;
  kind: CaseKind;
  urgency: Urgency;
  organisation: DemoOrganisation;
  material: DemoMaterialName;
  holder: DemoMail;
  questions: readonly string[];
  background: readonly { statement: string; standing: Standing; source: string }[];
  part: { description: string; serial?: string; maker?: string; environment?: string };
  pieces: readonly DemoPiece[];
  readings: readonly DemoReading[];
  estimates: readonly DemoEstimates[];
  /** Paragraphs under the outline's headings; {load}, {mirror}, {flaw} are bound values, {fig:n} a figure. */
  findings: Readonly<Record<string, string>>;
  /** The day its fractographs were taken, where it lay waiting; else two working days after it came. */
  examinedOn?: string;
  /** The day the images came to be bound to their true scale, after the findings were begun. */
  scaleFound?: { on: string; reason: string };
  end: DemoEnd;
  /** When it went to review, and when it was closed. */
  sentOn?: string;
  closedOn?: string;
};
