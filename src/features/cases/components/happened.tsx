import { useState } from 'react';
import type { CaseView } from '#shared/contracts/cases.ts';
import type { Answer } from '#shared/rules/may.ts';
import { Button } from '#src/ui/button.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { HappenedForm } from './happened-form.tsx';

/** What the case says of itself: what happened, to what kind of thing, of which material, how urgent. */
export function Happened({ view, mayEdit }: { view: CaseView; mayEdit: Answer }) {
  const [writing, setWriting] = useState(false);
  return (
    <section>
      <RuleHead aside={view.kind}>What happened</RuleHead>
      {writing ? (
        <HappenedForm view={view} onLeave={() => setWriting(false)} />
      ) : (
        <>
          <p className="prose-measure !text-base/[1.45]">
            {view.summary === '' ? <span className="text-ink-3">Not written down yet.</span> : view.summary}
          </p>
          <p className="mt-1 text-ink-2">
            Material: {view.material?.name ?? 'not said yet'}. Urgency: {view.urgency}.
          </p>
          <div className="acts mt-2">
            <Button small closedBecause={mayEdit.allowed ? null : mayEdit.reason} onClick={() => setWriting(true)}>
              Change this
            </Button>
          </div>
        </>
      )}
    </section>
  );
}
