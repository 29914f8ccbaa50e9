import { CheckIcon } from '@phosphor-icons/react/dist/csr/Check';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ClosureCheckView, CheckOutcome } from '#shared/contracts/closure.ts';
import { formatInstantIn } from '#shared/wording/instant-in-zone.ts';
import { ListedGlyph } from '#src/ui/glyphs/listed-glyph.tsx';
import { Button } from '#src/ui/button.tsx';
import { checkOf } from '../api.ts';
import { RefusalNote } from './refusal-note.tsx';

type Deviation = { words: string; outcome: CheckOutcome };

/** The closure looked over again: three lines where all is as it was, and by name whatever is not. */
export function CheckAgain({ number, zone }: { number: string; zone: string }) {
  const check = useQuery(checkOf(number));
  return (
    <section aria-label="Looked over again" className="mt-4">
      <div aria-live="polite">{check.data ? <Found check={check.data} /> : null}</div>
      <RefusalNote error={check.error} />
      <p className="mt-2 flex flex-wrap items-baseline gap-x-3 text-s text-ink-2">
        {check.isFetching
          ? 'Looking over every image and record…'
          : `Looked over ${check.data ? formatInstantIn(check.data.checkedAt, zone) : 'not yet'}.`}
        <Button small kind="plain" disabled={check.isFetching} onClick={() => void check.refetch()}>
          Look again now
        </Button>
      </p>
    </section>
  );
}

function Found({ check }: { check: ClosureCheckView }) {
  const records = recordDeviations(check);
  const estimates = check.estimates.filter((estimate) => !estimate.same);
  const signatures = check.signatures.filter(({ outcome }) => outcome !== 'same');
  return (
    <ul>
      {records.length === 0 ? <AsItWas>Every image and record still matches the list</AsItWas> : null}
      {records.map((each) => (
        <Differs key={`${each.words} ${each.outcome}`} outcome={each.outcome}>
          {each.words}
        </Differs>
      ))}
      {estimates.length === 0 ? <AsItWas>{reckoned(check.estimates.length)}</AsItWas> : null}
      {estimates.map(({ number }) => (
        <Differs key={number} outcome="changed" words="does not come out of its inputs">
          Estimate {number}
        </Differs>
      ))}
      {signatures.length === 0 ? <AsItWas>Every signature was given to exactly this</AsItWas> : null}
      {signatures.map(({ words }) => (
        <Differs key={words} outcome="changed" words="was given to other content">
          The signature of {words}
        </Differs>
      ))}
    </ul>
  );
}

function recordDeviations({ seal, parts, files }: ClosureCheckView): Deviation[] {
  const inParts = parts.flatMap(({ name, deviations }) =>
    deviations.map(({ words, outcome }) => ({ words: `${name}: ${words}`, outcome })),
  );
  return [...seal, ...inParts, ...files].filter(({ outcome }) => outcome !== 'same');
}

function reckoned(count: number): string {
  if (count === 0) return 'No estimate had to be reckoned again';
  if (count === 1) return 'The one estimate comes out the same from its inputs';
  return `${count === 2 ? 'Both' : `All ${count}`} estimates come out the same from their inputs`;
}

function AsItWas({ children }: { children: string }) {
  return (
    <li className="flex items-center gap-[10px] py-[2px] font-semibold text-celadon">
      <CheckIcon size={16} aria-hidden />
      {children}
    </li>
  );
}

type DiffersProps = { outcome: CheckOutcome; words?: string; children: ReactNode };

function Differs({ outcome, words, children }: DiffersProps) {
  return (
    <li className="flex items-start gap-[10px] py-[2px]">
      <span className="mt-1 flex-none">
        <ListedGlyph listed={outcome} />
      </span>
      <span className="min-w-0 [overflow-wrap:anywhere]">
        {children} <b className="text-iron">{words ?? (outcome === 'added' ? 'was put in' : `is ${outcome}`)}</b>
      </span>
    </li>
  );
}
