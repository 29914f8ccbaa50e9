import { mkdirSync, readdirSync, rmdirSync, statSync, unlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Failure } from './failure.mjs';
import { identityOf, isAlive, pidOf } from './process-identity.mjs';

// A lock folder without its owner's file is one whose maker died between two calls; a living maker needs far less.
const OWNERLESS_MS = 2000;

function attempt(action) {
  try {
    return action() ?? true;
  } catch {
    return undefined;
  }
}

function take(folder, owner) {
  try {
    mkdirSync(folder);
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
  return attempt(() => writeFileSync(join(folder, owner), '')) !== undefined;
}

// Only one of several waiters can remove the dead owner's file, and a folder with a new owner's file cannot be
// removed; so a lock is never taken from a living process.
function clearIfAbandoned(folder) {
  const owners = attempt(() => readdirSync(folder)) ?? [];
  const made = attempt(() => statSync(folder).mtimeMs) ?? Date.now();
  if (owners.length === 0 && Date.now() - made > OWNERLESS_MS) attempt(() => rmdirSync(folder));
  for (const owner of owners.filter((name) => !isAlive(name))) {
    if (attempt(() => unlinkSync(join(folder, owner)))) attempt(() => rmdirSync(folder));
  }
  return owners[0];
}

/**
 * Does one thing while no other process does it.
 * @param {string} folder the lock: a folder that exists while the lock is held
 * @param {() => Promise<T>} act
 * @param {{ signal?: AbortSignal, patienceMs?: number, say?: (sentence: string) => void }} options
 */
export async function withLock(folder, act, { signal, patienceMs = 600_000, say = () => undefined } = {}) {
  const owner = identityOf(process.pid);
  const since = Date.now();
  let told = false;
  while (!take(folder, owner)) {
    signal?.throwIfAborted();
    const other = clearIfAbandoned(folder);
    const waitedMs = Date.now() - since;
    if (waitedMs > patienceMs) {
      throw new Failure(`Another start of Hacklebook still holds ${folder}.`, 'Stop it, or remove that folder.');
    }
    if (!told && waitedMs > 2000 && other) {
      told = true;
      say(`Waiting for another start of Hacklebook (process ${pidOf(other)}) …`);
    }
    await wait(50 + Math.random() * 50);
  }
  try {
    return await act();
  } finally {
    attempt(() => unlinkSync(join(folder, owner)));
    attempt(() => rmdirSync(folder));
  }
}
