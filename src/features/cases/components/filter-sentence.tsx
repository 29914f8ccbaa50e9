import type { CasebookQuery } from '#shared/contracts/casebook.ts';
import type { CaseChoices } from '#shared/contracts/cases.ts';
import { caseStates } from '#shared/vocabulary/case-states.ts';
import { originCodes, originCodeTable } from '#shared/vocabulary/origin-codes.ts';
import { Choice, type ChoiceOption } from '#src/ui/choice.tsx';

type FilterSentenceProps = {
  query: CasebookQuery;
  choices: CaseChoices | undefined;
  /** Absent until the server has said which year it is. */
  thisYear: number | null;
  onChange: (change: Record<string, string>) => void;
};

const states: readonly ChoiceOption[] = [
  { value: 'any', words: 'every state' },
  { value: 'open', words: 'what is open' },
  { value: 'on hold', words: 'what is on hold' },
  ...caseStates.map((state) => ({ value: state, words: state })),
];
const origins: readonly ChoiceOption[] = [
  { value: 'any', words: 'any type' },
  ...originCodes.map((code) => ({ value: code, words: originCodeTable[code].word })),
];
const stalenesses: readonly ChoiceOption[] = [
  { value: '', words: 'stale or not' },
  { value: '1', words: 'stale only' },
];
const earlierYears = 4;

const earlierThan = (year: number | null) =>
  year === null ? [] : Array.from({ length: earlierYears }, (_, index) => String(year - 1 - index));

const orderWords: Record<CasebookQuery['order'], readonly [ascending: string, descending: string]> = {
  number: ['oldest number first', 'newest first'],
  age: ['youngest first', 'oldest first'],
  state: ['by state, the least far first', 'by state, the farthest first'],
  material: ['by material', 'by material, from Z to A'],
  title: ['by title', 'by title, from Z to A'],
};

/** The filters as one sentence that reads aloud, each dotted part a choice. */
export function FilterSentence({ query, choices, thisYear, onChange }: FilterSentenceProps) {
  const holders = [
    { value: 'anyone', words: 'anyone' },
    { value: 'me', words: 'me' },
    { value: 'no one', words: 'no one yet' },
    ...(choices?.analysts ?? []).map(({ id, name }) => ({ value: id, words: name })),
  ];
  const materials = [
    { value: 'any', words: 'any material' },
    ...(choices?.materials ?? []).map(({ id, name }) => ({ value: id, words: name })),
  ];
  const years = [
    { value: 'this', words: 'this year' },
    ...earlierThan(thisYear).map((year) => ({ value: year, words: year })),
    { value: 'any', words: 'any year' },
  ];
  const [up, down] = orderWords[query.order];
  const choice = (name: string, label: string, value: string, options: readonly ChoiceOption[]) => (
    <Choice {...{ label, value, options }} onChosen={(chosen) => onChange({ [name]: chosen })} />
  );
  return (
    <p className="filter-sentence">
      Show {choice('state', 'State', query.state, states)} held by {choice('held', 'Held by', query.held, holders)}, in{' '}
      {choice('material', 'Material', query.material, materials)}, with origin{' '}
      {choice('origin', 'Origin', query.origin, origins)}, received {choice('year', 'Year', String(query.year), years)},{' '}
      {choice('stale', 'Staleness', query.stale ?? '', stalenesses)}, {query.direction === 'ascending' ? up : down}.
    </p>
  );
}
