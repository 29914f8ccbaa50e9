import { Link } from 'react-router-dom';
import type { CasebookQuery } from '#shared/contracts/casebook.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { writeAddress } from '../casebook-address.ts';

type CasebookFootProps = { query: CasebookQuery; shown: number; total: number; earlier: number };

/** How many of how many are shown, and the way to the next and to earlier years. */
export function CasebookFoot({ query, shown, total, earlier }: CasebookFootProps) {
  const last = Math.max(1, Math.ceil(total / query.size));
  const first = (query.page - 1) * query.size + 1;
  const to = (page: number) => ({ pathname: '/', search: writeAddress({ ...query, page }) });
  return (
    <nav aria-label="Pages of the Casebook" className="flex flex-wrap gap-x-5 gap-y-1 pt-[9px] text-s text-ink-3">
      <span>
        {last === 1
          ? `${formatNumber(shown)} of ${formatNumber(total)} shown.`
          : `${formatNumber(first)} to ${formatNumber(first + shown - 1)} of ${formatNumber(total)}.`}
      </span>
      {query.page > 1 ? <Link to={to(query.page - 1)}>Page before</Link> : null}
      {query.page < last ? <Link to={to(query.page + 1)}>Next page</Link> : null}
      {last > 1 || query.size === 50 ? (
        <Link to={{ pathname: '/', search: writeAddress({ ...query, page: 1, size: query.size === 25 ? 50 : 25 }) }}>
          {query.size === 25 ? 'Fifty to a page' : 'Twenty-five to a page'}
        </Link>
      ) : null}
      {query.year === 'this' && earlier > 0 ? (
        <span>
          <Link to={{ pathname: '/', search: writeAddress({ ...query, page: 1, year: 'any' }) }}>Earlier years</Link>{' '}
          hold {formatNumber(earlier)} more.
        </span>
      ) : null}
    </nav>
  );
}
