import type { MarkView } from '#shared/contracts/marks.ts';

/** What can be changed of a mark from the list. */
export type MarkChange = Partial<Pick<MarkView, 'geometry' | 'certainty' | 'boundary' | 'originCode' | 'note'>>;
