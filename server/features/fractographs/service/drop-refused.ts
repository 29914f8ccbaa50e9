import type { VisitorContext } from '../../../http/context.ts';
import { countUsesOfBytes, lockBytes } from '../queries/fractographs.ts';
import { refusedBytesStayMs } from './cut-tiles.ts';

/** Takes the bytes of a refused file away a week after it came, unless they serve another image. */
export function dropRefused(context: VisitorContext, sha256: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    await lockBytes(tx, sha256);
    const weekAgo = new Date(tx.at.getTime() - refusedBytesStayMs);
    if ((await countUsesOfBytes(tx, sha256, weekAgo)) === 0) await context.storage.dropOriginal(sha256);
  });
}
