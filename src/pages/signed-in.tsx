import { useQuery } from '@tanstack/react-query';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { KeptSettings } from '../features/people/components/kept-settings.tsx';
import { SessionEndedDialog } from '../features/people/components/session-ended-dialog.tsx';
import { sessionQuery } from '../http/session.ts';
import { LoadingState } from '../ui/loading-state.tsx';
import { ErrorState } from '../ui/error-state.tsx';

/** Lets only signed-in people on; others go to the sign-in and come back to where they wanted to be. */
export function SignedIn() {
  const session = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  if (session.isPending) return <LoadingState words="Opening the book…" />;
  if (session.isError) return <ErrorState what="The book could not be opened." why={session.error.message} />;
  if (!session.data.person) return <Navigate to={`/sign-in?to=${encodeURIComponent(pathname + search)}`} replace />;
  return (
    <>
      <Outlet />
      <KeptSettings settings={session.data.settings} />
      <SessionEndedDialog person={session.data.person} />
    </>
  );
}
