import type { CasebookCounts } from '#shared/contracts/casebook.ts';
import { daysBetween } from '#shared/wording/dates.ts';
import { asSentence, counted, countInWords } from '#shared/wording/number-words.ts';

/** How the Casebook stands, in words: "Fifteen cases this year, the oldest open for 51 days." */
export function leadSentence({ thisYear, open, oldestOpenAt, asOf }: CasebookCounts): string {
  const many = asSentence(counted(thisYear, 'case'));
  if (open === 0 || oldestOpenAt === null) return `${many} this year, none open.`;
  const days = daysBetween(oldestOpenAt, asOf);
  return `${many} this year, ${countInWords(open)} open, the oldest for ${counted(days, 'day')}.`;
}

/** What holds a stale value. */
export function staleSentence(stale: number): string {
  return stale === 0 ? 'Nothing is stale' : `${asSentence(countInWords(stale))} ${stale === 1 ? 'holds' : 'hold'} `;
}

/** What waits for a reviewer. */
export function reviewSentence(inReview: number): string {
  return inReview === 0
    ? 'none waits for a reviewer.'
    : `${countInWords(inReview)} ${inReview === 1 ? 'waits' : 'wait'} for a reviewer.`;
}
