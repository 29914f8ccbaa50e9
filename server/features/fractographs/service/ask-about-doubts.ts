import type { FractographView, ScaleBinding } from '#shared/contracts/fractographs.ts';
import { compareWays, type WayAtHand } from '#shared/rules/calibration-check.ts';
import type { CalibrationWay } from '#shared/vocabulary/fractographs.ts';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { listCalibrationsOf } from '../../laboratory/service/find-calibrations.ts';
import { listBindingsOf } from '../queries/bindings.ts';

type ChosenWay = WayAtHand & { readonly way: CalibrationWay | 'kept'; readonly spreadDoubt: string | null };

/**
 * Holds the chosen way against every other at hand: the file's tag, the bar read on this image, the field width told, and
 * what the laboratory keeps for the same instrument and objective.
 * @throws Problem not-ready (field `confirm`, every doubt in `fields`) until confirmed; not-valid without a reason
 */
export async function askAboutDoubts(
  tx: Transaction,
  image: FractographView,
  chosen: ChosenWay,
  asked: ScaleBinding,
): Promise<void> {
  const doubts = compareWays(chosen, await listOtherWays(tx, image, chosen)).map((doubt) => doubt.sentence);
  if (chosen.spreadDoubt) doubts.unshift(chosen.spreadDoubt);
  if (doubts.length === 0) return;
  const fields = Object.fromEntries(doubts.map((sentence, index) => [`doubt ${index + 1}`, sentence]));
  if (!asked.confirmed)
    throw new Problem('not-ready', `${doubts.join(' ')} Confirm with a reason, or choose another way.`, {
      field: 'confirm',
      fields,
      stillHolds: 'Nothing was bound; your readings are still on this page.',
    });
  if (!asked.reason)
    throw new Problem('not-valid', 'Say why this scale is the right one although another way disagrees.', {
      field: 'reason',
      fields,
    });
}

async function listOtherWays(tx: Transaction, image: FractographView, chosen: ChosenWay): Promise<WayAtHand[]> {
  const ways: WayAtHand[] = [];
  if (image.tagPixelSizeUm !== null && chosen.way !== 'file tags')
    ways.push({ name: 'the file’s own tag', pixelSizeUm: image.tagPixelSizeUm });
  if (image.fieldWidthMm !== null && image.widthPx !== null)
    ways.push({ name: 'the field width told', pixelSizeUm: (image.fieldWidthMm * 1000) / image.widthPx });
  const bar = (await listBindingsOf(tx, image.id)).find((row) => row.calibration.way === 'burned bar');
  if (bar && bar.calibration.code === null && chosen.way !== 'burned bar')
    ways.push({ name: 'the bar read before', pixelSizeUm: bar.calibration.pixelSizeXUm });
  if (image.instrument && image.objective) {
    const kept = await listCalibrationsOf(tx, image.instrument.id, image.objective);
    for (const { calibration } of kept)
      ways.push({ name: `${calibration.code} of the same objective`, pixelSizeUm: calibration.pixelSizeXUm });
  }
  return ways;
}
