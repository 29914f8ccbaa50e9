import type { FindingsFacts } from '../contracts/findings.ts';
import type { OriginLies } from '../vocabulary/pieces.ts';
import type { EstimateLine } from '../vocabulary/estimate-lines.ts';
import type { FractographState } from '../vocabulary/fractographs.ts';

/** What of a case decides whether it can go to review. */
export type ReadinessFacts = {
  readonly onHold: boolean;
  readonly agreedQuestions: number;
  readonly parts: number;
  readonly fractographs: readonly {
    readonly figureNumber: number;
    readonly state: FractographState;
    readonly hasScale: boolean;
    /** Marks on it that a length is read from. */
    readonly marksWithLength: number;
  }[];
  readonly originsMarked: number;
  /** Missing pieces that the origin may lie on, and whether the findings name them. */
  readonly missingPieces: readonly { code: string; originLies: OriginLies; isNamedInFindings: boolean }[];
  /** Estimates that nothing supersedes. */
  readonly estimates: readonly {
    readonly number: number;
    readonly line: EstimateLine;
    readonly isSetAside: boolean;
    readonly isStale: boolean;
  }[];
  readonly findings: Pick<FindingsFacts, 'unresolved' | 'emptyParts'> & {
    /** Nothing stands under any heading. */
    readonly isEmpty: boolean;
    readonly staleBoundValues: readonly Pick<FindingsFacts['staleBoundValues'][number], 'words' | 'part'>[];
  };
};

export type ReadinessChapter = 'intake' | 'evidence' | 'fractographs' | 'estimates' | 'findings';

export type ReadinessPoint = {
  readonly code: string;
  /** A blocker must be gone before review; a note may be accepted by a manager with a reason. */
  readonly kind: 'blocker' | 'note';
  readonly sentence: string;
  readonly chapter: ReadinessChapter;
};

type Rule = (facts: ReadinessFacts) => ReadinessPoint[];

/** What stands between a case and its review: blockers first, each group in the order of the chapters. */
export function readinessOf(facts: ReadinessFacts): ReadinessPoint[] {
  const points = rules.flatMap((rule) => rule(facts));
  return [...points.filter((point) => point.kind === 'blocker'), ...points.filter((point) => point.kind === 'note')];
}

const ifSo = (holds: boolean, point: ReadinessPoint): ReadinessPoint[] => (holds ? [point] : []);

const blocker = (code: string, chapter: ReadinessChapter, sentence: string): ReadinessPoint => ({
  ...{ code, chapter, sentence },
  kind: 'blocker',
});
const note = (code: string, chapter: ReadinessChapter, sentence: string): ReadinessPoint => ({
  ...{ code, chapter, sentence },
  kind: 'note',
});

const intakeRule: Rule = ({ onHold, agreedQuestions }) => [
  ...ifSo(onHold, blocker('on-hold', 'intake', 'The case is on hold.')),
  ...ifSo(agreedQuestions === 0, blocker('no-question', 'intake', 'No question has been agreed.')),
];

const evidenceRule: Rule = ({ parts, missingPieces }) => [
  ...ifSo(parts === 0, blocker('no-part', 'evidence', 'Nothing says yet what broke.')),
  ...missingPieces
    .filter((piece) => piece.originLies !== 'no' && !piece.isNamedInFindings)
    .map(({ code }) =>
      note(
        'limit-unsaid',
        'evidence',
        `The origin may lie on ${code}, which is missing, and the findings do not say so.`,
      ),
    ),
];

const fractographRule: Rule = ({ fractographs, originsMarked }) => {
  const underWay = fractographs.filter(({ state }) => state !== 'ready' && state !== 'refused');
  const ready = fractographs.filter(({ state }) => state === 'ready');
  return [
    ...underWay.map(({ figureNumber, state }) =>
      blocker('file-under-way', 'fractographs', `Fig. ${figureNumber} is still ${stateWords[state] ?? state}.`),
    ),
    ...ifSo(
      ready.length === 0 && underWay.length === 0,
      blocker('no-fractograph', 'fractographs', 'No fractograph is ready.'),
    ),
    ...ready
      .filter(({ hasScale, marksWithLength }) => !hasScale && marksWithLength > 0)
      .map(({ figureNumber }) =>
        note('no-scale', 'fractographs', `Fig. ${figureNumber} has no scale, so no length is read from its marks.`),
      ),
    ...ifSo(originsMarked === 0, note('no-origin', 'fractographs', 'No origin is marked.')),
  ];
};

const stateWords: Partial<Record<FractographState, string>> = { receiving: 'coming in', checking: 'being checked' };

const estimateRule: Rule = ({ estimates }) => {
  const inUse = estimates.filter((estimate) => !estimate.isSetAside);
  const lines = new Set(inUse.map((estimate) => estimate.line));
  return [
    ...inUse
      .filter((estimate) => estimate.isStale)
      .map(({ number }) =>
        blocker('estimate-stale', 'estimates', `Estimate ${number} rests on something that has changed.`),
      ),
    ...ifSo(inUse.length === 0, note('no-estimate', 'estimates', 'No stress has been estimated.')),
    ...ifSo(
      lines.size === 1,
      note('one-line', 'estimates', `Only one line of evidence stands: ${[...lines].join()}. Nothing checks it.`),
    ),
    ...estimates
      .filter((estimate) => estimate.isSetAside)
      .map(({ number, line }) => note('set-aside', 'estimates', `Estimate ${number}, ${line} line, is set aside.`)),
  ];
};

const findingsRule: Rule = ({ findings: { isEmpty, staleBoundValues, unresolved, emptyParts } }) => [
  ...ifSo(isEmpty, blocker('findings-empty', 'findings', 'Nothing is written in the findings.')),
  ...staleBoundValues.map(({ words, part }) =>
    blocker('findings-stale', 'findings', `${words}, in “${part}”, rests on something that has changed.`),
  ),
  ...ifSo(
    unresolved > 0,
    blocker(
      'unresolved',
      'findings',
      unresolved === 1
        ? 'One value in the findings has no source.'
        : `${unresolved} values in the findings have no source.`,
    ),
  ),
  ...(isEmpty ? [] : emptyParts.map((part) => note('part-empty', 'findings', `“${part}” is empty.`))),
];

const rules: readonly Rule[] = [intakeRule, evidenceRule, fractographRule, estimateRule, findingsRule];
