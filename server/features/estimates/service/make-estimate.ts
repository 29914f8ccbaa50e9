import type { EstimateWanted } from '#shared/contracts/estimates.ts';
import type { Method } from '#shared/numeric/methods/method.ts';
import { findCurrentMethod } from '#shared/numeric/methods.ts';
import type { Context } from '../../../http/context.ts';
import { Problem } from '../../../http/problem.ts';
import { lockCase, type HeldFor } from '../../../rights/open-case.ts';
import { keepEstimate } from './keep-estimate.ts';
import { loadSuperseded } from './load-superseded.ts';
import { resolveInputs } from './resolve-inputs.ts';

/**
 * Makes an estimate from what was typed, marked and taken from materials; nothing of an earlier one is overwritten.
 * @returns its id
 * @throws Problem not-valid by input; stale-version where the superseded one has been made again meanwhile
 */
export function makeEstimate(context: Context, heldCase: HeldFor<'estimate'>, wanted: EstimateWanted): Promise<string> {
  const method = methodFor(wanted.method);
  return context.inTransaction(async (tx) => {
    await lockCase(tx, context, heldCase, 'estimate');
    const reader = { tx, context, heldCase };
    const supersedes = wanted.supersedesId === null ? null : await loadSuperseded(reader, wanted.supersedesId);
    if (supersedes && supersedes.line !== method.line) {
      throw new Problem('not-valid', `Estimate ${supersedes.number} is of the ${supersedes.line} line, this is not.`, {
        field: 'method',
      });
    }
    const inputs = await resolveInputs(reader, method, wanted.inputs);
    const { boundaryNote, remark } = wanted;
    return keepEstimate(reader, { method, inputs, supersedes, boundaryNote, remark });
  });
}

/** The newest version of a method. @throws Problem not-valid */
export function methodFor(id: string): Method {
  const method = findCurrentMethod(id);
  if (!method || method.line === 'supporting') {
    throw new Problem('not-valid', `There is no method “${id}” for a stress at the origin: choose one from the list.`, {
      field: 'method',
    });
  }
  return method;
}
