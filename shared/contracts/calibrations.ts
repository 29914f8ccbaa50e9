import { z } from 'zod';
import { caseStates } from '../vocabulary/case-states.ts';
import { calibrationWays } from '../vocabulary/fractographs.ts';
import { instrumentKinds } from '../vocabulary/instrument-kinds.ts';
import { CaseNumber } from './ids.ts';

export const InstrumentEntered = z.object({
  name: z.string().trim().min(2, 'An instrument has a name.').max(120),
  kind: z.enum(instrumentKinds),
});
export type InstrumentEntered = z.infer<typeof InstrumentEntered>;

export const InstrumentView = z.object({ id: z.uuid(), name: z.string(), kind: z.enum(instrumentKinds) });
export type InstrumentView = z.infer<typeof InstrumentView>;
export const InstrumentList = z.array(InstrumentView);

/** A calibration kept for an instrument, as a person enters it. */
export const CalibrationEntered = z.object({
  instrumentId: z.uuid(),
  /** Objective, magnification: "20×". */
  setting: z.string().trim().min(1, 'Say which objective or magnification.').max(200),
  way: z.enum(calibrationWays),
  pixelSizeXUm: z.number().positive('A pixel size is above 0 µm.'),
  pixelSizeYUm: z.number().positive('A pixel size is above 0 µm.').optional(),
  /** U / value at k = 2, per cent. */
  expandedUncertaintyPercent: z.number().positive('A calibration has an uncertainty above 0.').max(50),
  source: z.string().trim().min(3, 'Name the reference: graticule, certificate.').max(500),
  /** By how much the one before was found out, per cent; absent where none was. */
  asFoundErrorPercent: z.number().min(-100).max(1000).nullable().default(null),
  validFrom: z.iso.date(),
});
export type CalibrationEntered = z.infer<typeof CalibrationEntered>;

/** Takes the place of a kept calibration; all that was read with the older one turns stale. */
export const CalibrationReplaced = CalibrationEntered.omit({ instrumentId: true }).extend({
  reason: z.string().trim().min(5, 'Say why it is replaced; it stands beside every value that turns stale.').max(2000),
});
export type CalibrationReplaced = z.infer<typeof CalibrationReplaced>;

export const CalibrationView = z.object({
  id: z.uuid(),
  code: z.string(),
  instrument: InstrumentView,
  setting: z.string(),
  way: z.enum(calibrationWays),
  pixelSizeXUm: z.number().positive(),
  pixelSizeYUm: z.number().positive(),
  relativeUncertainty: z.number().nonnegative(),
  source: z.string(),
  asFoundErrorPercent: z.number().nullable(),
  validFrom: z.iso.date(),
  reason: z.string().nullable(),
  madeBy: z.object({ id: z.uuid(), name: z.string() }),
  madeAt: z.iso.datetime(),
  /** The one that took its place; absent while it is in force. */
  replacedBy: z.object({ id: z.uuid(), code: z.string(), validFrom: z.iso.date() }).nullable(),
});
export type CalibrationView = z.infer<typeof CalibrationView>;
export const CalibrationList = z.array(CalibrationView);

/** What hangs on a calibration, across cases. */
export const CalibrationReach = z.object({
  bindings: z.number().int(),
  lengths: z.number().int(),
  estimates: z.number().int(),
  boundValues: z.number().int(),
  cases: z.array(z.object({ number: CaseNumber, state: z.enum(caseStates) })),
  /** Cases that hang on it and that the asker may not see. */
  otherCases: z.number().int(),
});
export type CalibrationReach = z.infer<typeof CalibrationReach>;

export const CalibrationPath = z.object({ calibrationId: z.uuid() });
