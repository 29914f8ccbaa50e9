import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';
import { Frontispiece } from '../features/people/components/frontispiece.tsx';
import { SignInForm } from '../features/people/components/sign-in-form.tsx';
import { sessionQuery, takeSession } from '../http/session.ts';
import { takeBookTheme } from '../theme/theme.ts';
import { Note } from '../ui/note.tsx';

/** Where everyone comes in. */
export function Component() {
  const session = useQuery(sessionQuery);
  const [search] = useSearchParams();
  if (session.data?.person) return <Navigate to={placeWithin(search.get('to'))} replace />;
  return (
    <Frontispiece>
      {search.has('set') ? (
        <Note tone="celadon" className="mb-5" lead="Your new password is kept.">
          Sign in with it; you have been signed out everywhere else.
        </Note>
      ) : null}
      <SignInForm
        onSignedIn={(begun) => {
          if (begun.settings) takeBookTheme(begun.settings.theme);
          takeSession(begun);
        }}
      />
      <p className="mt-7 border-t border-rule pt-4 text-s text-ink-2">
        No account of your own? One comes by invitation from the laboratory.
      </p>
    </Frontispiece>
  );
}

/** A place of this book; whatever else the address names leads to the first page. */
function placeWithin(to: string | null): string {
  return to !== null && /^\/(?![/\\])/.test(to) && !to.startsWith('/sign-in') ? to : '/';
}
