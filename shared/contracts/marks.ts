import { z } from 'zod';
import { certainties } from '../vocabulary/certainties.ts';
import { markKinds } from '../vocabulary/mark-kinds.ts';
import { mirrorBoundaries } from '../vocabulary/mirror-boundaries.ts';
import { measuredQuantities } from '../vocabulary/measured-quantities.ts';
import { originCodes } from '../vocabulary/origin-codes.ts';
import { Named } from './fractographs.ts';
import { CaseNumber, FractographId } from './ids.ts';

/** A place on an image, image px from its upper left corner; never screen px. */
export const PointPx = z.object({ x: z.number(), y: z.number() });
export type PointPx = z.infer<typeof PointPx>;

/** Where a flaw lies: its outline meets the surface, lies just below it, lies inside, or sits on an edge. */
export const flawPlaces = ['surface', 'near surface', 'interior', 'edge'] as const;
export const flawShapes = ['half-ellipse', 'ellipse', 'quarter-ellipse', 'irregular'] as const;

/** A length mark may say that it runs from the tensile surface down to the origin. */
export const lengthMeasures = ['length', 'depth of origin'] as const;

export const MarkGeometry = z.discriminatedUnion('shape', [
  z.object({ shape: z.literal('point'), at: PointPx }),
  z.object({
    shape: z.literal('segment'),
    from: PointPx,
    to: PointPx,
    /** What a length mark measures: absent for a plain length. */
    measures: z.enum(lengthMeasures).optional(),
  }),
  z.object({
    shape: z.literal('chain'),
    points: z.array(PointPx).min(2).max(2000),
    /** The origin the radii are read from; absent until an origin is marked. */
    centre: PointPx.optional(),
  }),
  z.object({
    shape: z.literal('ellipse'),
    centre: PointPx,
    /** Half-axis into the section, and along the surface, image px, > 0. */
    halfAxisDepthPx: z.number().positive(),
    halfAxisAlongPx: z.number().positive(),
    /** Turn of the depth axis from straight up, degrees. */
    turnDeg: z.number(),
    flawShape: z.enum(flawShapes),
    place: z.enum(flawPlaces),
    /** The points it was drawn through, kept as drawn. */
    points: z.array(PointPx).max(500),
  }),
]);
export type MarkGeometry = z.infer<typeof MarkGeometry>;

export const MarkDrawn = z.object({
  kind: z.enum(markKinds),
  geometry: MarkGeometry,
  certainty: z.enum(certainties),
  boundary: z.enum(mirrorBoundaries).nullable(),
  originCode: z.enum(originCodes).nullable(),
  note: z.string().max(2000),
});
export type MarkDrawn = z.infer<typeof MarkDrawn>;

/** A mark as it is sent: the id comes from the bench that drew it, so that sending it again draws it once. */
export const MarkSent = MarkDrawn.extend({ id: z.uuid().optional() });
export type MarkSent = z.infer<typeof MarkSent>;

/** A change names the version it was made from; fields left out stay as they are. */
export const MarkChanged = MarkDrawn.omit({ kind: true }).partial().extend({ versionSeen: z.number().int() });
export type MarkChanged = z.infer<typeof MarkChanged>;
export const MarkRemoved = z.object({ versionSeen: z.number().int() });
export type MarkRemoved = z.infer<typeof MarkRemoved>;

export const MarkView = MarkDrawn.extend({
  id: z.uuid(),
  /** m7, through the case. */
  number: z.number().int(),
  fractographId: FractographId,
  versionId: z.uuid(),
  version: z.number().int(),
  removed: z.boolean(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
});
export type MarkView = z.infer<typeof MarkView>;
export const MarkList = z.array(MarkView);

/** One state a mark has had; the newest is the one in force. */
export const MarkVersionView = MarkView.omit({ id: true, number: true, fractographId: true });
export type MarkVersionView = z.infer<typeof MarkVersionView>;
export const MarkVersionList = z.array(MarkVersionView);

/** A length that may be taken as an input: read from the mark in force on the scale in force. */
export const MeasurementView = z.object({
  markId: z.uuid(),
  /** m7. */
  markNumber: z.number().int(),
  kind: z.enum(markKinds),
  certainty: z.enum(certainties),
  /** Which edge of the mirror was read; null for what is no mirror. */
  boundary: z.enum(mirrorBoundaries).nullable(),
  flawShape: z.enum(flawShapes).nullable(),
  flawPlace: z.enum(flawPlaces).nullable(),
  fractographId: FractographId,
  figureNumber: z.number().int(),
  quantity: z.enum(measuredQuantities),
  /** How it was read, in words: "mean of 7 directions". */
  way: z.string(),
  valuePx: z.number(),
  /** Absent, with its uncertainty, while the image has no scale. */
  valueMm: z.number().nullable(),
  standardUncertaintyMm: z.number().nullable(),
});
export type MeasurementView = z.infer<typeof MeasurementView>;
export const MeasurementList = z.array(MeasurementView);

/** Which length of which mark. */
export const MeasurementWanted = z.object({ markId: z.uuid(), quantity: z.enum(measuredQuantities) });
export type MeasurementWanted = z.infer<typeof MeasurementWanted>;

export const MarkPath = z.object({ number: CaseNumber, fractographId: FractographId, markId: z.uuid() });
