import { Link } from 'react-router-dom';
import type { CasebookCounts, CasebookQuery } from '#shared/contracts/casebook.ts';
import { SavedTabs, TabCount } from '#src/ui/saved-tabs.tsx';
import { writeAddress } from '../casebook-address.ts';

type CasebookTabsProps = { counts: CasebookCounts | undefined; query: CasebookQuery };

type Tab = { words: string; query: Partial<CasebookQuery>; count: keyof CasebookCounts };

const tabs: readonly Tab[] = [
  { words: 'This year', query: {}, count: 'thisYear' },
  { words: 'With me', query: { year: 'any', held: 'me', state: 'open' }, count: 'withMe' },
  { words: 'Waits for my signature', query: { year: 'any', sign: '1' }, count: 'toSign' },
  { words: 'Stale', query: { year: 'any', stale: '1' }, count: 'stale' },
  { words: 'All years', query: { year: 'any' }, count: 'all' },
];

/** The filters kept for everyone, each with how many cases it holds. */
export function CasebookTabs({ counts, query }: CasebookTabsProps) {
  const here = writeAddress({ ...query, page: 1, size: 25, order: 'number', direction: 'descending' });
  return (
    <SavedTabs label="Saved filters">
      {tabs.map((tab) => {
        const address = writeAddress(tab.query);
        return (
          <Link
            key={tab.words}
            to={{ pathname: '/', search: address }}
            aria-current={here === address ? 'true' : undefined}
          >
            {tab.words} {counts ? <TabCount>{counts[tab.count]}</TabCount> : null}
          </Link>
        );
      })}
    </SavedTabs>
  );
}
