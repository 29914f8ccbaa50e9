import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { identityOf, isAlive, pidOf } from './process-identity.mjs';
import { inProject } from './project.mjs';

// One small file for each running start, named for its process: who still uses the cluster, and which server is left
// over when a start was killed.
const FOLDER = inProject('.run', 'starts');
const SELF = identityOf(process.pid);

function read(name) {
  try {
    return JSON.parse(readFileSync(join(FOLDER, name), 'utf8'));
  } catch {
    return {};
  }
}

/** Notes this start, whether it uses the project's cluster, and the server process it has begun. */
export function noteStart({ usesCluster, serverPid }) {
  mkdirSync(FOLDER, { recursive: true });
  const server = serverPid === undefined ? undefined : identityOf(serverPid);
  writeFileSync(join(FOLDER, SELF), JSON.stringify({ usesCluster, server }));
}

/** Forgets this start; returns whether another living start still uses the cluster. */
export function forgetStart() {
  mkdirSync(FOLDER, { recursive: true });
  rmSync(join(FOLDER, SELF), { force: true });
  return readdirSync(FOLDER).some((name) => isAlive(name) && read(name).usesCluster === true);
}

async function endServer(server) {
  for (const [signalName, patienceMs] of [
    ['SIGTERM', 8000],
    ['SIGKILL', 2000],
  ]) {
    // prettier-ignore
    const until = Date.now() + patienceMs;
    if (isAlive(server)) process.kill(pidOf(server), signalName);
    while (isAlive(server) && Date.now() < until) await wait(50);
  }
}

/** Ends the servers whose start was killed, so that they hold neither port nor database. */
export async function endServersLeftOver(say) {
  mkdirSync(FOLDER, { recursive: true });
  for (const name of readdirSync(FOLDER).filter((other) => !isAlive(other))) {
    const { server } = read(name);
    if (server && isAlive(server)) {
      say(`Ending the server left over from a start that was killed (process ${pidOf(server)}) …`);
      await endServer(server);
    }
    rmSync(join(FOLDER, name), { force: true });
  }
}
