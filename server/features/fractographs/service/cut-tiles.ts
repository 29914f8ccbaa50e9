import { recordAct } from '../../../audit/record-act.ts';
import type { VisitorContext } from '../../../http/context.ts';
import type { ImageFacts } from '../../../imaging/image-facts.ts';
import { formatInWords } from '../../../imaging/image-facts.ts';
import { cut, examine, longestPassS } from '../../../imaging/image-pool.ts';
import type { PixelSizeTag } from '../../../imaging/pixel-size-tags.ts';
import { enqueueJob } from '../../../jobs/enqueue.ts';
import { findForCutting, noteProgress } from '../queries/fractographs.ts';

type Waiting = NonNullable<Awaited<ReturnType<typeof findForCutting>>>;

// Long enough for the one who brought it in to read why, and to look at what came.
export const refusedBytesStayMs = 7 * 24 * 60 * 60 * 1000;

/**
 * Decodes a file that came in whole and cuts its tiles, or refuses it with a reason in plain words. A second run gives the
 * same; nothing is done for an image that is settled already.
 */
export async function cutTiles(context: VisitorContext, fractographId: string): Promise<void> {
  const waiting = await findForCutting(context.reader, fractographId);
  if (!waiting || waiting.fractograph.state === 'ready' || waiting.fractograph.state === 'refused') return;
  const limits = { largestImagePx: context.limits.largestImagePx, longestPassS };
  const file = await context.storage.originalFile(waiting.fractograph.sha256);
  const examined = await examine(file, limits);
  if (examined.kind === 'refused') return refuse(context, waiting, examined.reason);
  await noteProgress(context.reader, fractographId, { state: 'cutting tiles', progress: 0, ...found(examined) });
  const folder = await context.storage.workFolder();
  try {
    const onProgress = (share: number) => noteProgress(context.reader, fractographId, { progress: share });
    const done = await cut({ file, facts: examined.facts, limits, folder }, onProgress);
    if (done.kind === 'refused') return await refuse(context, waiting, done.reason);
    const { sha256 } = waiting.fractograph;
    await context.storage.keepDerived(sha256, 'facts/image.json', Buffer.from(JSON.stringify(examined.facts)));
    await context.storage.keepDerivedFolder(sha256, folder);
    await finish(context, waiting);
  } finally {
    await context.storage.dropWorkFolder(folder);
  }
}

function found({ facts, tag }: { facts: ImageFacts; tag: PixelSizeTag | null }) {
  return {
    format: formatInWords(facts),
    widthPx: facts.widthPx,
    heightPx: facts.heightPx,
    bitDepth: facts.bitDepth,
    tagPixelSizeUm: tag?.pixelSizeUm ?? null,
    tagSource: tag?.source ?? null,
  };
}

function finish(context: VisitorContext, { fractograph, number }: Waiting): Promise<void> {
  return context.inTransaction(async (tx) => {
    await noteProgress(tx, fractograph.id, { state: 'ready', progress: 1 });
    await recordAct(tx, null, {
      act: 'fractograph.ready',
      inCase: { id: fractograph.caseId, number },
      objectId: fractograph.id,
    });
  });
}

/** A refused file keeps its name, hash and reason; its bytes go after a week. */
function refuse(context: VisitorContext, { fractograph, number }: Waiting, reason: string): Promise<void> {
  return context.inTransaction(async (tx) => {
    await noteProgress(tx, fractograph.id, { state: 'refused', refusedReason: reason, progress: 0 });
    await recordAct(tx, null, {
      act: 'fractograph.refused',
      inCase: { id: fractograph.caseId, number },
      objectId: fractograph.id,
      after: { fileName: fractograph.fileName, sha256: fractograph.sha256, reason },
    });
    const { sha256 } = fractograph;
    const runAt = new Date(tx.at.getTime() + refusedBytesStayMs);
    await enqueueJob(tx, 'drop-refused', { sha256 }, `drop-refused ${fractograph.id}`, runAt);
  });
}
