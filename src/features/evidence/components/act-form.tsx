import type { FormEventHandler, ReactNode } from 'react';
import { Refusal } from '#src/http/api.ts';
import { Button } from '#src/ui/button.tsx';
import { Note } from '#src/ui/note.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';

type ActFormProps = {
  title: ReactNode;
  aside?: ReactNode;
  /** The act: "Receive the piece". */
  act: string;
  /** What failed, if something did. */
  error: Error | null;
  isSending: boolean;
  onSubmit: FormEventHandler<HTMLFormElement>;
  onLeave: () => void;
  children: ReactNode;
};

/** A form in the page for one act; what was typed stays on every refusal. */
export function ActForm({ title, aside, act, error, isSending, onSubmit, onLeave, children }: ActFormProps) {
  return (
    <form noValidate onSubmit={onSubmit} className="mt-5 first:mt-0">
      <RuleHead small aside={aside}>
        {title}
      </RuleHead>
      <div className="mt-3 flex flex-col gap-4">
        {children}
        {error ? <WhatFailed error={error} /> : null}
        <div className="acts">
          <Button type="submit" kind="main" disabled={isSending}>
            {act}
          </Button>
          <Button kind="plain" onClick={onLeave}>
            Leave it
          </Button>
        </div>
      </div>
    </form>
  );
}

/** Two fields side by side, one under the other where it is narrow. */
export function FieldPair({ children }: { children: ReactNode }) {
  return <div className="grid grid-cols-2 items-start gap-4 narrow:grid-cols-1">{children}</div>;
}

function WhatFailed({ error }: { error: Error }) {
  const holds = error instanceof Refusal ? error.body.stillHolds : null;
  return (
    <Note tone="iron" alert lead={error.message}>
      {holds ?? 'Nothing was lost: what you typed is still here.'}
    </Note>
  );
}
