import { useState } from 'react';
import type { PartView } from '#shared/contracts/evidence.ts';
import { Button } from '#src/ui/button.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { PartForm, type MaterialOffered } from './part-form.tsx';
import { factsOfPart } from './part-lines.ts';

type PartFactsProps = { number: string; part: PartView; mayChange: boolean; materials: readonly MaterialOffered[] };

/** What broke: one part and what is known of it. */
export function PartFacts({ number, part, mayChange, materials }: PartFactsProps) {
  const [changing, setChanging] = useState(false);
  if (changing)
    return (
      <div className="mb-6">
        <PartForm number={number} part={part} materials={materials} onDone={() => setChanging(false)} />
      </div>
    );
  const facts = factsOfPart(part);
  return (
    <div className="mb-5">
      <RuleHead
        aside={
          mayChange ? (
            <Button kind="plain" small onClick={() => setChanging(true)}>
              Change what is known
            </Button>
          ) : null
        }
      >
        {part.description}
      </RuleHead>
      {facts.length === 0 ? (
        <p className="mt-2 text-ink-2">Nothing more is known of it yet.</p>
      ) : (
        <dl className="mt-2 grid grid-cols-[max-content_minmax(0,1fr)] gap-x-5 gap-y-1">
          {facts.map(({ word, value }) => (
            <div key={word} className="contents">
              <dt className="text-ink-2">{word}</dt>
              <dd className="[overflow-wrap:anywhere]">{value}</dd>
            </div>
          ))}
        </dl>
      )}
    </div>
  );
}
