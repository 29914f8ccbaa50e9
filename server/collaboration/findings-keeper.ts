import type { FindingsNews } from '#shared/contracts/findings.ts';
import type { CaseNumber } from '#shared/contracts/ids.ts';
import { recordAct } from '../audit/record-act.ts';
import { contextFor, type ContextParts } from '../http/context.ts';
import { Problem } from '../http/problem.ts';
import { lockCase, openCase } from '../rights/open-case.ts';
import type { Written } from './findings-queue.ts';
import { appendUpdate } from './findings-rows.ts';

// An entry in the trail says that someone wrote, not each key that was pressed.
const writtenAgainAfterMs = 10 * 60 * 1000;
// What the database answers to a write under a closed case (drizzle/0001_defences.sql).
const underSeal = 'HB001';

/** Commits what people write: the right and the state of the case are asked again each time, under its lock. */
export class FindingsKeeper {
  readonly #parts: ContextParts;
  readonly #lastWritten = new Map<string, number>();

  constructor(parts: ContextParts) {
    this.#parts = parts;
  }

  /** @returns when it was committed. @throws Problem where the person may not write there any more */
  async keep(number: CaseNumber, { update, person }: Written): Promise<Date> {
    const context = contextFor(person, this.#parts);
    const heldCase = await openCase(context, number, 'write findings');
    const key = `${person.id} in ${heldCase.id}`;
    const last = this.#lastWritten.get(key);
    const kept = await context.inTransaction(async (tx) => {
      await lockCase(tx, context, heldCase, 'write findings');
      await appendUpdate(tx, { caseId: heldCase.id, update, madeBy: person.id });
      const isEntered = last === undefined || tx.at.getTime() - last >= writtenAgainAfterMs;
      if (isEntered) await recordAct(tx, person, { act: 'findings.written', inCase: heldCase });
      return { at: tx.at, isEntered };
    });
    if (kept.isEntered) this.#lastWritten.set(key, kept.at.getTime());
    return kept.at;
  }
}

/** Why nothing was kept, for whoever has the text on the page. */
export function whyNotKept(error: unknown): FindingsNews {
  if (error instanceof Problem) return { kind: 'not kept', words: error.message, again: false };
  if (codeOf(error) === underSeal)
    return { kind: 'not kept', words: 'This case is closed and sealed; it changes only by amendment.', again: false };
  return { kind: 'not kept', words: 'The laboratory’s server could not keep this just now.', again: true };
}

function codeOf(error: unknown): unknown {
  if (!(error instanceof Error)) return undefined;
  return 'code' in error ? error.code : codeOf(error.cause);
}
