import type { CaseAct } from '#shared/rules/may.ts';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { nothingHere, type HeldFor } from '../../../rights/open-case.ts';
import { findFragmentRow, findPartRow, hasMaterial } from '../queries.ts';

/** Loads a part of the case. @throws Problem not-found */
export async function loadPart(tx: Transaction, heldCase: HeldFor<CaseAct>, id: string) {
  const part = await findPartRow(tx, heldCase, id);
  if (!part) throw nothingHere();
  return part;
}

/** Loads a piece of the case. @throws Problem not-found */
export async function loadFragment(tx: Transaction, heldCase: HeldFor<CaseAct>, id: string) {
  const fragment = await findFragmentRow(tx, heldCase, id);
  if (!fragment) throw nothingHere();
  return fragment;
}

/** @throws Problem not-valid where no such material is kept */
export async function requireMaterial(tx: Transaction, id: string | null): Promise<void> {
  if (id !== null && !(await hasMaterial(tx, id)))
    throw new Problem('not-valid', 'That material is not kept here; choose another.', { field: 'materialId' });
}

/** @throws Problem stale-version, with what stands now, where someone changed it since it was seen */
export function requireVersion(seen: number, now: { version: number }, current: unknown): void {
  if (seen === now.version) return;
  throw new Problem('stale-version', 'Someone changed this since you opened it. Look at both before you go on.', {
    stillHolds: 'What you typed is kept on this page; nothing was written over.',
    current,
  });
}
