import { QueryClient } from '@tanstack/react-query';
import { Refusal } from './api.ts';

/** One cache for the page. What the server refuses is not asked again; a lost connection is. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 10_000,
      refetchOnWindowFocus: true,
      retry: (failures, error) => !(error instanceof Refusal) && failures < 3,
    },
    mutations: { retry: false },
  },
});
