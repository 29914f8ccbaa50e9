import { z } from 'zod';
import { caseStates } from '../vocabulary/case-states.ts';
import { constantKinds, materialFamilies, sourceStandings } from '../vocabulary/constant-kinds.ts';
import { Named } from './fractographs.ts';
import { CaseNumber } from './ids.ts';

export const MaterialEntered = z.object({
  name: z.string().trim().min(1, 'Type the name of the material.').max(120),
  family: z.enum(materialFamilies),
  route: z.string().trim().max(300).nullable(),
  grainSizeUm: z.number().positive('A grain size is more than 0 µm.').nullable(),
  note: z.string().trim().max(2000).nullable(),
});
export type MaterialEntered = z.infer<typeof MaterialEntered>;
export const MaterialChanged = MaterialEntered.partial().extend({ versionSeen: z.number().int() });
export type MaterialChanged = z.infer<typeof MaterialChanged>;

/** A constant as typed: value with its unit, and ± either as U (k = 2) or as standard uncertainty u. */
export const ConstantTyped = z.object({
  kind: z.enum(constantKinds),
  /** With its unit: "3.5 MPa m½". */
  value: z.string().trim().min(1, 'Type the value with its unit.').max(60),
  /** In the same unit where none is typed. */
  plusMinus: z.string().trim().min(1, 'Type the ± of the value.').max(60),
  plusMinusIs: z.enum(['U', 'u']),
  source: z.string().trim().min(1, 'Say where the value comes from; a constant without a source is refused.').max(300),
  sourceStanding: z.enum(sourceStandings),
  condition: z.string().trim().max(300).nullable(),
  validFrom: z.iso.date('Say from which day it holds.'),
  reason: z.string().trim().max(1000).nullable(),
  /** The record in force that the writer saw; none for the first of its kind. */
  replaces: z.uuid().nullable(),
});
export type ConstantTyped = z.infer<typeof ConstantTyped>;

export const ConstantView = z.object({
  id: z.uuid(),
  materialId: z.uuid(),
  recordNumber: z.number().int(),
  kind: z.enum(constantKinds),
  /** In the unit of the kind. */
  value: z.number(),
  /** Standard uncertainty in the same unit; U (k = 2) is twice it. */
  standardUncertainty: z.number(),
  unit: z.string(),
  enteredText: z.string(),
  source: z.string(),
  sourceStanding: z.enum(sourceStandings),
  condition: z.string().nullable(),
  validFrom: z.iso.date(),
  reason: z.string().nullable(),
  supersedesId: z.uuid().nullable(),
  supersededById: z.uuid().nullable(),
  madeBy: Named,
  madeAt: z.iso.datetime(),
});
export type ConstantView = z.infer<typeof ConstantView>;
export const ConstantList = z.array(ConstantView);

export const MaterialView = MaterialEntered.extend({
  id: z.uuid(),
  constantsInForce: z.number().int(),
  version: z.number().int(),
});
export type MaterialView = z.infer<typeof MaterialView>;
export const MaterialList = z.array(MaterialView);

/** A material with all its records of constants, by kind and then newest first. */
export const MaterialWithConstants = MaterialView.extend({ constants: ConstantList, asOf: z.iso.datetime() });
export type MaterialWithConstants = z.infer<typeof MaterialWithConstants>;

/** What hangs on a record of a constant: what a change of it would make stale. */
export const ConstantReach = z.object({
  estimates: z.number().int(),
  boundValues: z.number().int(),
  cases: z.number().int(),
  closedCases: z.number().int(),
  /** Those the person may see, by number. */
  casesSeen: z.array(z.object({ number: CaseNumber, state: z.enum(caseStates), estimates: z.number().int() })),
});
export type ConstantReach = z.infer<typeof ConstantReach>;

export const MaterialPath = z.object({ materialId: z.uuid() });
export const ConstantPath = z.object({ materialId: z.uuid(), constantId: z.uuid() });
export const ConstantsQuery = z.object({ on: z.iso.date().optional() });
