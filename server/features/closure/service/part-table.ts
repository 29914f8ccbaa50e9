import type { GatheredTable } from '../queries/gather-rows.ts';
import type { HeldRows } from './part-holdings.ts';
import { holdingOf } from './part-holdings.ts';

export type PartRow = {
  readonly key: string;
  readonly chapter: string;
  readonly name: string;
  readonly tables: readonly GatheredTable[];
  holding(rows: HeldRows): string;
};

/** What a closure seals, part by part: everything the seal's tables hold of the case, and the records relied on. */
export const contentParts: readonly PartRow[] = [
  {
    key: 'intake',
    chapter: 'i',
    name: 'Intake and what was asked',
    tables: ['cases', 'case_questions', 'case_background'],
    holding: holdingOf.intake,
  },
  {
    key: 'evidence',
    chapter: 'ii',
    name: 'Evidence: parts and pieces',
    tables: ['parts', 'fragments', 'mates'],
    holding: holdingOf.evidence,
  },
  {
    key: 'fractographs',
    chapter: 'iii',
    name: 'Fractographs',
    tables: ['fractographs'],
    holding: holdingOf.fractographs,
  },
  {
    key: 'marks',
    chapter: '',
    name: 'Marks and scales on them',
    tables: ['marks', 'mark_versions', 'measurements', 'calibrations', 'calibration_bindings'],
    holding: holdingOf.marks,
  },
  {
    key: 'estimates',
    chapter: 'iv',
    name: 'Estimates and their inputs',
    tables: ['estimates', 'estimate_inputs', 'estimate_standings'],
    holding: holdingOf.estimates,
  },
  {
    key: 'relied-on',
    chapter: '',
    name: 'Records relied on, as they stood',
    tables: ['constants relied on', 'calibrations relied on'],
    holding: holdingOf.reliedOn,
  },
  {
    key: 'findings',
    chapter: 'vi',
    name: 'Findings',
    tables: ['findings_updates', 'findings_versions', 'bound_values', 'figures'],
    holding: holdingOf.findings,
  },
];

/** Grows until the closing itself, and so stands outside what a signature vouches for. */
export const trailPart: PartRow = {
  key: 'trail',
  chapter: 'vii',
  name: 'Who did what, and when',
  tables: ['case_authors', 'reviews', 'accepted_notes', 'signatures', 'audit_entries'],
  holding: holdingOf.trail,
};
