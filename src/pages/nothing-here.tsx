import { ButtonLink } from '../ui/button-link.tsx';
import { EmptyState } from '../ui/empty-state.tsx';

/** The same words for what is not there and for what one may not see. */
export function NothingHere() {
  return (
    <main id="content" className="mx-auto mt-10 max-w-[640px]">
      <EmptyState
        title="Nothing here under this address"
        acts={<ButtonLink to="/">Go to the first page</ButtonLink>}
        help="The same words stand for a case that isn’t there and one you may not see."
      >
        If you followed a link, ask whoever sent it to name you on the case. It may also have been mistyped.
      </EmptyState>
    </main>
  );
}
