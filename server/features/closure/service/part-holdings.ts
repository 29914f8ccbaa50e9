import { z } from 'zod';

/** The rows of a part by the table they were gathered from. */
export type HeldRows = Readonly<Record<string, readonly Readonly<Record<string, unknown>>[]>>;

const kilo = 1000;
const sizeUnits = ['bytes', 'kB', 'MB', 'GB', 'TB'] as const;

/** What each part of a case holds, in words. */
export const holdingOf = {
  intake: (rows: HeldRows) =>
    listed(counted(newestQuestions(rows), 'question'), counted(standing(rows.case_background).length, 'statement')),
  evidence: (rows: HeldRows) => listed(counted(rows.parts.length, 'part'), counted(rows.fragments.length, 'piece')),
  fractographs: ({ fractographs }: HeldRows) => {
    const bytes = fractographs.reduce((sum, row) => sum + Number(row.bytes), 0);
    return fractographs.length === 0 ? 'none' : `${counted(fractographs.length, 'image')}, ${formatBytes(bytes)}`;
  },
  marks: (rows: HeldRows) =>
    listed(counted(rows.marks.length, 'mark'), counted(distinct(rows.calibration_bindings, 'fractograph_id'), 'scale')),
  estimates: (rows: HeldRows) =>
    listed(counted(rows.estimates.length, 'estimate'), counted(rows.estimate_inputs.length, 'input')),
  reliedOn: (rows: HeldRows) =>
    listed(
      counted(rows['constants relied on'].length, 'constant'),
      counted(rows['calibrations relied on'].length, 'calibration'),
    ),
  findings: (rows: HeldRows) => {
    const newest = [...rows.findings_versions].sort((one, other) => Number(other.number) - Number(one.number)).at(0);
    const words = newest ? countWords(newest.content) : 0;
    const version = newest ? `version ${Number(newest.number)}` : '';
    return listed(version, counted(words, 'word'), counted(standing(rows.figures).length, 'figure'));
  },
  trail: (rows: HeldRows) => listed(counted(rows.audit_entries.length, 'entry', 'entries')),
} as const;

/** The number of bytes for a person: "1.9 GB". Steps of a thousand. */
export function formatBytes(bytes: number): string {
  const step = bytes < kilo ? 0 : Math.min(sizeUnits.length - 1, Math.floor(Math.log(bytes) / Math.log(kilo)));
  const size = bytes / kilo ** step;
  return `${step === 0 || size >= 100 ? Math.round(size) : size.toFixed(1)} ${sizeUnits[step]}`;
}

function newestQuestions({ case_questions: versions }: HeldRows): number {
  const newest = [...versions].sort((one, other) => Number(other.version) - Number(one.version)).at(0);
  return z.array(z.unknown()).catch([]).parse(newest?.questions).length;
}

const standing = (rows: HeldRows[string]) => {
  const superseded = new Set(rows.map((row) => row.supersedes_id));
  return rows.filter((row) => !row.taken_back_at && !superseded.has(row.id));
};

const distinct = (rows: HeldRows[string], column: string) => new Set(rows.map((row) => row[column])).size;

function countWords(content: unknown): number {
  return textsOf(content).join(' ').split(/\s+/).filter(Boolean).length;
}

/** Every text in a ProseMirror document, a bound value or a figure counting by what it shows. */
function textsOf(node: unknown): string[] {
  if (Array.isArray(node)) return node.flatMap(textsOf);
  if (typeof node !== 'object' || node === null) return [];
  const own = 'text' in node && typeof node.text === 'string' ? [node.text] : [];
  return [...own, ...('content' in node ? textsOf(node.content) : [])];
}

function counted(count: number, noun: string, plural = `${noun}s`): string {
  if (count === 0) return '';
  return `${grouped(count)} ${count === 1 ? noun : plural}`;
}

/** Thousands apart from ten thousand on, by a narrow space. */
function grouped(count: number): string {
  return count < 10 * kilo ? String(count) : String(count).replace(/\B(?=(\d{3})+$)/g, '\u202F');
}

function listed(...words: string[]): string {
  return words.filter((each) => each !== '').join(', ') || 'none';
}
