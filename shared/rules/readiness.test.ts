import { describe, expect, it } from 'vitest';
import { readinessOf, type ReadinessFacts } from './readiness.ts';

const ready: ReadinessFacts = {
  onHold: false,
  agreedQuestions: 1,
  parts: 1,
  fractographs: [{ figureNumber: 1, state: 'ready', hasScale: true, marksWithLength: 2 }],
  originsMarked: 1,
  missingPieces: [],
  estimates: [
    { number: 1, line: 'load', isSetAside: false, isStale: false },
    { number: 2, line: 'mirror', isSetAside: false, isStale: false },
  ],
  findings: { isEmpty: false, staleBoundValues: [], unresolved: 0, emptyParts: [] },
};

const codesOf = (change: Partial<ReadinessFacts>) => readinessOf({ ...ready, ...change }).map((point) => point.code);
const findings = (change: Partial<ReadinessFacts['findings']>) => ({ findings: { ...ready.findings, ...change } });

describe('a case on its way to review', () => {
  it('has nothing in its way when everything stands', () => {
    expect(readinessOf(ready)).toEqual([]);
  });

  it.each<[string, Partial<ReadinessFacts>, string]>([
    ['on hold', { onHold: true }, 'on-hold'],
    ['without an agreed question', { agreedQuestions: 0 }, 'no-question'],
    ['that does not say what broke', { parts: 0 }, 'no-part'],
    ['without a fractograph', { fractographs: [] }, 'no-fractograph'],
    [
      'with a file still being cut',
      {
        fractographs: [
          ...ready.fractographs,
          { figureNumber: 2, state: 'cutting tiles', hasScale: false, marksWithLength: 0 },
        ],
      },
      'file-under-way',
    ],
    [
      'with a stale estimate',
      { estimates: [{ ...ready.estimates[0], isStale: true }, ready.estimates[1]] },
      'estimate-stale',
    ],
    [
      'with a stale value or figure in the findings',
      findings({ staleBoundValues: [{ words: 'Stress, flaw line', part: 'Stress at the origin' }] }),
      'findings-stale',
    ],
    ['with a value that points at nothing', findings({ unresolved: 1 }), 'unresolved'],
    ['whose findings are empty', findings({ isEmpty: true, emptyParts: ['What was asked'] }), 'findings-empty'],
  ])('is blocked when it is one %s', (_words, change, code) => {
    const points = readinessOf({ ...ready, ...change });
    expect(points.map(({ code: found, kind }) => ({ found, kind }))).toEqual([{ found: code, kind: 'blocker' }]);
  });

  it.each<[string, Partial<ReadinessFacts>, string]>([
    ['no origin is marked', { originsMarked: 0 }, 'no-origin'],
    ['no stress is estimated', { estimates: [] }, 'no-estimate'],
    ['only one line stands', { estimates: [ready.estimates[0]] }, 'one-line'],
    [
      'a line is set aside',
      { estimates: [...ready.estimates, { number: 3, line: 'flaw', isSetAside: true, isStale: true }] },
      'set-aside',
    ],
    [
      'marks stand on an image without a scale',
      { fractographs: [{ ...ready.fractographs[0], hasScale: false }] },
      'no-scale',
    ],
    [
      'a missing piece that may carry the origin is not named as a limit',
      { missingPieces: [{ code: 'M1', originLies: 'not known', isNamedInFindings: false }] },
      'limit-unsaid',
    ],
    ['one part of the outline is empty', findings({ emptyParts: ['What came in'] }), 'part-empty'],
  ])('has a note when %s', (_words, change, code) => {
    const points = readinessOf({ ...ready, ...change });
    expect(points.map(({ code: found, kind }) => ({ found, kind }))).toEqual([{ found: code, kind: 'note' }]);
  });

  it('says nothing of a missing piece that the origin does not lie on, or that the findings name', () => {
    const missingPieces = [
      { code: 'M1', originLies: 'no', isNamedInFindings: false },
      { code: 'M2', originLies: 'yes', isNamedInFindings: true },
    ] as const;
    expect(codesOf({ missingPieces })).toEqual([]);
  });

  it('names blockers before notes', () => {
    expect(codesOf({ originsMarked: 0, ...findings({ unresolved: 1 }) })).toEqual(['unresolved', 'no-origin']);
  });
});
