import type { Agreement, JudgedPair } from '../rules/agreement.ts';
import { formatNumber } from './quantity.ts';

/** The verdict with its numbers, in sentences after the verdict's own word. */
export function verdictInWords(agreement: Agreement): string {
  if (agreement.pairs.length === 0) return 'Fewer than two lines are in force, so there is nothing to compare.';
  const widest = widestPair(agreement.pairs);
  return [gapInWords(widest), weaklyInWords(agreement), chiSquaredInWords(agreement), sharedInWords(agreement.pairs)]
    .filter((sentence) => sentence !== '')
    .join(' ');
}

/** What three lines show together, in a few words: "flaw alone high"; nothing to say where all agree. */
export function patternInWords(agreement: Agreement): string {
  const { pattern } = agreement;
  if (!pattern || pattern.kind === 'all-agree') return '';
  if (pattern.kind === 'outlier') return `The ${pattern.line} line alone is ${pattern.side}.`;
  if (pattern.kind === 'ambiguous') return `The ${pattern.middle} line lies between two that do not agree.`;
  return 'No two lines agree.';
}

function widestPair(pairs: readonly JudgedPair[]): JudgedPair {
  return pairs.reduce((widest, pair) => (Math.abs(pair.en) > Math.abs(widest.en) ? pair : widest));
}

function gapInWords(pair: JudgedPair): string {
  const [one, other] = pair.lines;
  const gap = formatNumber(Math.abs(pair.en), { decimals: 2 });
  return `The widest gap, ${one} against ${other}, is ${gap} of its joint uncertainty; the rule allows 1.`;
}

function weaklyInWords(agreement: Agreement): string {
  return agreement.weakly ? 'Weakly: one side is so uncertain that agreeing says little.' : '';
}

function chiSquaredInWords(agreement: Agreement): string {
  if (!agreement.chiSquaredOverLimit) return '';
  return 'Together the lines scatter more than their uncertainties allow, so there is no pooled value.';
}

function sharedInWords(pairs: readonly JudgedPair[]): string {
  const sharing = pairs.filter((pair) => pair.sharedInputs.length > 0);
  const [first] = sharing;
  if (!first) return '';
  const [one, other] = first.lines;
  return `${capital(one)} and ${other} are two lines, one scale: they share the ${first.sharedInputs.join(' and ')}.`;
}

const capital = (word: string) => word.charAt(0).toUpperCase() + word.slice(1);
