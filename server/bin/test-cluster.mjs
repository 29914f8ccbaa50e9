import { chmodSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startCluster, stopCluster } from './cluster.mjs';
import { identityOf, isAlive } from './process-identity.mjs';

const PREFIX = 'hacklebook-test-';
const OWNER = 'owner';

async function remove(folder) {
  await stopCluster(join(folder, 'cluster'));
  rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
}

function isLeftOver(folder) {
  try {
    const mine = statSync(join(folder, OWNER)).uid === process.getuid();
    return mine && !isAlive(readFileSync(join(folder, OWNER), 'utf8'));
  } catch {
    return false;
  }
}

/** Removes the clusters of earlier test runs that were killed. */
async function removeLeftOver() {
  const folders = readdirSync(tmpdir()).filter((name) => name.startsWith(PREFIX));
  for (const folder of folders.map((name) => join(tmpdir(), name)).filter(isLeftOver)) {
    // What cannot be removed hinders nobody: every run has a folder of its own.
    await remove(folder).catch(() => undefined);
  }
}

/**
 * Starts an empty PostgreSQL server for one run of the tests, in a temporary folder; `stop` removes both.
 * @param {{ signal?: AbortSignal, say?: (sentence: string) => void }} options
 * @returns {Promise<{ url: string, stop: () => Promise<void> }>}
 */
export async function startTestCluster({ signal, say = () => undefined } = {}) {
  await removeLeftOver();
  const folder = mkdtempSync(join(tmpdir(), PREFIX));
  writeFileSync(join(folder, OWNER), identityOf(process.pid));
  // mkdtemp makes it for its maker alone, and the user postgres must enter it.
  chmodSync(folder, 0o755);
  try {
    const cluster = await startCluster({ folder: join(folder, 'cluster'), forTests: true, signal, say });
    return { url: cluster.url('postgres'), stop: () => remove(folder) };
  } catch (error) {
    await remove(folder).catch(() => undefined);
    throw error;
  }
}
