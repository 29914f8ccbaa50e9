import { Problem } from '../../../http/problem.ts';

/**
 * Refuses a change made from a version that has since been replaced, and shows what stands now.
 * `what` names the thing as the refusal's sentence begins.
 */
export async function requireSeenVersion(
  seen: number,
  now: { version: number; what: string; current: () => Promise<unknown> },
): Promise<void> {
  if (seen === now.version) return;
  throw new Problem('stale-version', `${now.what} was changed while you wrote.`, {
    stillHolds: 'Nothing of yours is lost: both versions stand here side by side.',
    current: await now.current(),
  });
}
