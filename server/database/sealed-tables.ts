/**
 * What a seal rests on: under a closed case the database refuses every write to these (`cases` itself takes only what
 * its own trigger leaves open). A new table goes into this list or the next; a test fails while it is in neither.
 */
export const sealedTables = [
  'cases',
  'case_questions',
  'case_background',
  'case_authors',
  'parts',
  'fragments',
  'mates',
  'calibrations',
  'fractographs',
  'calibration_bindings',
  'marks',
  'mark_versions',
  'measurements',
  'estimates',
  'estimate_inputs',
  'estimate_standings',
  'findings_updates',
  'findings_versions',
  'bound_values',
  'figures',
  'reviews',
  'accepted_notes',
  'signatures',
  'closures',
] as const;

/** What hangs beside a case, or stands outside cases, and stays open after a closure. */
export const openTables = [
  'organisations',
  'people',
  'person_roles',
  'one_time_links',
  'sign_in_tries',
  'sessions',
  'outgoing_mails',
  'held_mails',
  'audit_entries',
  'done_acts',
  'lineage',
  'staleness',
  'counters',
  'materials',
  'material_constants',
  'instruments',
  'kept_files',
  'case_people',
] as const;

/** Records: rows that are only ever added, closed case or not. */
export const recordTables = [
  'audit_entries',
  'lineage',
  'material_constants',
  'calibrations',
  'calibration_bindings',
  'case_questions',
  'mark_versions',
  'measurements',
  'estimates',
  'estimate_inputs',
  'estimate_standings',
  'findings_versions',
  'bound_values',
  'figures',
  'signatures',
  'closures',
  'kept_files',
] as const;
