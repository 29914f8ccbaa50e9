import type { FractographDescribed, FractographView } from '#shared/contracts/fractographs.ts';
import type { FractographId } from '#shared/contracts/ids.ts';
import { recordAct } from '../../../audit/record-act.ts';
import type { Transaction } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { findInstrument } from '../../laboratory/service/find-calibrations.ts';
import { changeFractograph, hasFragment } from '../queries/fractographs.ts';
import { loadFractograph } from './find-fractographs.ts';

type Bringing = HeldFor<'bring in fractographs'>;

/** Keeps what a person says of a fractograph. @throws Problem stale-version with the version kept meanwhile */
export async function describeFractograph(
  context: Context,
  heldCase: Bringing,
  id: FractographId,
  described: FractographDescribed,
): Promise<FractographView> {
  const { versionSeen, ...change } = described;
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'bring in fractographs');
    const before = await loadFractograph(tx, heldCase, id);
    await requireOwn(tx, heldCase, described);
    const kept = Object.keys(change).length === 0 || (await changeFractograph(tx, id, versionSeen, change));
    if (!kept)
      throw new Problem('stale-version', `Fig. ${before.figureNumber} was described by someone else meanwhile.`, {
        current: before,
        stillHolds: 'Both versions are kept until you choose.',
      });
    const after = await loadFractograph(tx, heldCase, id);
    await recordAct(tx, context.person, {
      act: 'fractograph.described',
      inCase: heldCase,
      objectId: id,
      before: said(before),
      after: said(after),
    });
    return after;
  });
}

/** What a person said of it, as the trail keeps it. */
function said(view: FractographView) {
  const { caption, face, view: seen, standing, objective, fieldWidthMm, tiltDeg, illumination } = view;
  const { detector, coating, takenBy, takenOn } = view;
  const [fragment, instrument] = [view.fragment?.code ?? null, view.instrument?.name ?? null];
  return {
    ...{ caption, fragment, face, view: seen, standing, instrument, objective, fieldWidthMm, tiltDeg },
    ...{ illumination, detector, coating, takenBy, takenOn },
  };
}

async function requireOwn(tx: Transaction, heldCase: Bringing, described: FractographDescribed): Promise<void> {
  const { fragmentId, instrumentId } = described;
  if (fragmentId && !(await hasFragment(tx, heldCase, fragmentId)))
    throw new Problem('not-valid', 'There is no such piece in this case.', { field: 'fragmentId' });
  if (instrumentId && !(await findInstrument(tx, instrumentId)))
    throw new Problem('not-valid', 'There is no such instrument.', { field: 'instrumentId' });
}
