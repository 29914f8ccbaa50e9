/** Does one thing while no other process does it; the lock is a folder that exists while it is held. */
export function withLock<T>(
  folder: string,
  act: () => Promise<T>,
  options?: { signal?: AbortSignal; patienceMs?: number; say?: (sentence: string) => void },
): Promise<T>;
