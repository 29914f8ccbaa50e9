/** Starts an empty PostgreSQL server for one run of the tests, in a temporary folder; `stop` removes both. */
export function startTestCluster(options?: {
  signal?: AbortSignal;
  say?: (sentence: string) => void;
}): Promise<{ url: string; stop: () => Promise<void> }>;
