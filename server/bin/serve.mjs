import { setTimeout as wait } from 'node:timers/promises';
import { Failure } from './failure.mjs';
import { beginServer } from './server-process.mjs';
import { sourceStamp } from './source-stamp.mjs';
import { stopSignal } from './stop-request.mjs';

const WATCHED = ['server', 'shared'];
const LOOK_EVERY_MS = 700;

function stopRequested() {
  return new Promise((resolve) => {
    if (stopSignal().aborted) resolve('stop');
    stopSignal().addEventListener('abort', () => resolve('stop'), { once: true });
  });
}

async function endInOrder(server) {
  const code = await server.stop();
  if (code !== 0) throw new Failure('The server had to be ended by force, or failed while ending.');
}

/**
 * Runs the built server until it ends or a stop is asked for.
 * @param {{ variables: object, onBegin: (server: { pid: number, kill: () => void }) => void }} options
 */
export async function serve({ variables, onBegin }) {
  const server = beginServer({ develop: false, variables });
  onBegin(server);
  const outcome = await Promise.race([server.ended, stopRequested()]);
  if (outcome === 'stop') return endInOrder(server);
  if (outcome !== 0) {
    throw new Failure(`The server ended with code ${outcome}.`, 'Its own message above says why.', outcome);
  }
}

async function sourcesChanged(before) {
  while (sourceStamp(WATCHED) === before) {
    await wait(LOOK_EVERY_MS);
    if (stopSignal().aborted) return 'stop';
  }
  return 'changed';
}

/** Runs the server from its sources and begins it again after each change, also after it failed. */
export async function serveWhileDeveloping({ variables, onBegin, say }) {
  while (!stopSignal().aborted) {
    const stamp = sourceStamp(WATCHED);
    const server = beginServer({ develop: true, variables });
    onBegin(server);
    void server.ended.then((code) => code !== 0 && say(`The server ended with code ${code}; waiting for a change …`));
    if ((await sourcesChanged(stamp)) === 'stop') return endInOrder(server);
    say('Sources have changed; beginning the server again …');
    await server.stop();
  }
}
