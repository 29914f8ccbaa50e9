import { useRouteError } from 'react-router-dom';
import { Refusal } from '../http/api.ts';
import { Button } from '../ui/button.tsx';
import { ErrorState } from '../ui/error-state.tsx';
import { NothingHere } from './nothing-here.tsx';

/** What stands where a page could not be drawn. */
export function PageFailed() {
  const error = useRouteError();
  if (error instanceof Refusal && error.body.code === 'not-found') return <NothingHere />;
  return (
    <main id="content" className="mx-auto mt-10 max-w-[640px]">
      <ErrorState
        what="This page could not be shown."
        why={error instanceof Error ? error.message : undefined}
        holds="Nothing was lost: what had been kept stands as it was."
        acts={<Button onClick={() => window.location.reload()}>Load the page again</Button>}
      />
    </main>
  );
}
