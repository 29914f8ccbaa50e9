import { Link } from 'react-router-dom';
import type { FractographView } from '#shared/contracts/fractographs.ts';

type FigureStripProps = {
  caseNumber: string;
  fractographs: readonly FractographView[];
  shownId: string;
  /** Where a press on a figure leads. */
  addressOf: (fractograph: FractographView) => string;
};

/** The figures of a case side by side, the shown one under a bar. */
export function FigureStrip({ caseNumber, fractographs, shownId, addressOf }: FigureStripProps) {
  return (
    <nav aria-label="Figures" className="mt-4 grid grid-cols-4 gap-[14px] narrow:grid-cols-2">
      {fractographs.map((each) => (
        <Link
          key={each.id}
          to={addressOf(each)}
          replace
          preventScrollReset
          aria-current={each.id === shownId ? 'true' : undefined}
          className="block border-t-[3px] border-transparent pt-1 text-s/[1.3] text-ink-2 no-underline aria-[current]:border-ink"
        >
          {each.state === 'ready' ? (
            <img
              src={`/api/cases/${caseNumber}/fractographs/${each.id}/preview?width=400`}
              alt=""
              loading="lazy"
              className="aspect-[152/100] w-full bg-plate object-cover"
            />
          ) : (
            <span className="grid aspect-[152/100] place-items-center bg-plate text-xs text-on-plate-2">
              {each.state}
            </span>
          )}
          <span className="mt-1 block">
            <b className="mr-1 font-serif font-medium italic text-ink">Fig. {each.figureNumber}</b>
            {each.view ?? each.caption}
          </span>
        </Link>
      ))}
    </nav>
  );
}
