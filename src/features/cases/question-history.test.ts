import { describe, expect, it } from 'vitest';
import type { QuestionsView } from '#shared/contracts/cases.ts';
import { questionsShown, questionsTakenOut } from './question-history.ts';

const version = (number: number, texts: Record<string, string>): QuestionsView => ({
  ...{ version: number, besideScope: '', reason: number === 1 ? null : 'we can look, not give leave' },
  questions: Object.entries(texts).map(([key, text]) => ({ key, text })),
  madeBy: { id: '01990000-0000-7000-8000-000000000000', name: 'Ana Lyst' },
  madeAt: '2026-06-23T10:00:00Z',
});
const versions = [
  version(3, { q1: 'Where did it start?', q2: 'Do the others hold the same flaw?' }),
  version(2, { q1: 'Where did it start?', q2: 'Are the others safe?', q3: 'Who pays?' }),
  version(1, { q1: 'Where did it start?', q2: 'Are the others safe?' }),
];

describe('the questions of a case', () => {
  it('say since which version they read so, and what they read before', () => {
    expect(questionsShown(versions)).toMatchObject([
      { key: 'q1', since: 1, before: null },
      { key: 'q2', since: 3, before: 'Are the others safe?', changedIn: { version: 3 } },
    ]);
  });

  it('name what was taken out last', () => {
    expect(questionsTakenOut(versions).map(({ text }) => text)).toEqual(['Who pays?']);
    expect(questionsShown([])).toEqual([]);
  });
});
