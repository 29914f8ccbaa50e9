import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { LinkView } from '#shared/contracts/people.ts';
import { ErrorState } from '#src/ui/error-state.tsx';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { linkQuery, type LinkPurpose } from '../api.ts';

type OneTimeLinkProps = {
  purpose: LinkPurpose;
  token: string;
  /** What to do about a link that no longer works. */
  wayOn: ReactNode;
  children: (link: LinkView) => ReactNode;
};

/** Reads whom a link is for; one that no longer works says so and what to do. */
export function OneTimeLink({ purpose, token, wayOn, children }: OneTimeLinkProps) {
  const link = useQuery(linkQuery(purpose, token));
  if (link.isPending) return <LoadingState words="Reading the link…" />;
  if (link.isError) return <ErrorState what={link.error.message} why={wayOn} />;
  return children(link.data);
}
