import { createHash } from 'node:crypto';
import type { Transaction } from '../../../database/connection.ts';
import { Problem } from '../../../http/problem.ts';
import { countTry, findLockEnd, forgetTries, takeTryBack, type TryLimit } from '../queries/sign-in-tries.ts';

/** Where a try comes from: the address typed and the machine's network address. */
export type TriedFrom = { readonly mail: string; readonly machine: string };

/** Failed tries that an address may have before it waits. */
export const freeTriesOfAddress = 5;
// A laboratory or a maker often comes from one network address; its people must not lock each other out by typing.
const freeTriesOfMachine = 30;

function limitsOf({ mail, machine }: TriedFrom): { address: TryLimit; machine: TryLimit } {
  return {
    address: { key: keyOf('mail', mail.trim().toLowerCase()), free: freeTriesOfAddress },
    machine: { key: keyOf('machine', machine), free: freeTriesOfMachine },
  };
}

// Hashed, because people type passwords into the wrong field.
const keyOf = (kind: string, word: string) => `${kind}:${createHash('sha256').update(word).digest('hex')}`;

/**
 * Counts a try before its password is looked at, whether or not the address belongs to anyone.
 * @returns the tries left to this address after this one, should it fail
 * @throws Problem too-many-tries, saying how long to wait
 */
export async function admitTry(tx: Transaction, from: TriedFrom): Promise<number> {
  const limits = limitsOf(from);
  const ofAddress = await countTry(tx, limits.address);
  if (ofAddress === null) throw await mustWait(tx, limits.address.key);
  if ((await countTry(tx, limits.machine)) === null) throw await mustWait(tx, limits.machine.key);
  return Math.max(0, freeTriesOfAddress - ofAddress);
}

/** After a try that succeeded: the address is free again, and the machine has one try fewer against it. */
export async function forgiveTry(tx: Transaction, from: TriedFrom): Promise<void> {
  const limits = limitsOf(from);
  await forgetTries(tx, limits.address.key);
  await takeTryBack(tx, limits.machine);
}

/** After a new password: whoever holds the mailbox of the address may try afresh. */
export function forgiveAddress(tx: Transaction, mail: string): Promise<void> {
  return forgetTries(tx, limitsOf({ mail, machine: '' }).address.key);
}

async function mustWait(tx: Transaction, key: string): Promise<Problem> {
  const end = await findLockEnd(tx, key);
  const minutes = end ? Math.max(1, Math.ceil((end.getTime() - tx.at.getTime()) / 60_000)) : 1;
  return new Problem(
    'too-many-tries',
    `Too many tries. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`}, then try again.`,
  );
}
