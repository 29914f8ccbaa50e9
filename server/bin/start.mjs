import { mkdirSync } from 'node:fs';
import { buildProduct } from './build.mjs';
import { ensureDatabase, startCluster, stopCluster } from './cluster.mjs';
import { Failure, sentencesFor } from './failure.mjs';
import { withLock } from './lock.mjs';
import { requireNode } from './node-version.mjs';
import { ensurePackages } from './packages.mjs';
import { untilAnswers } from './ports.mjs';
import { inProject } from './project.mjs';
import { endServersLeftOver, forgetStart, noteStart } from './running-starts.mjs';
import { choosePort } from './serving-port.mjs';
import { keptSecret } from './session-secret.mjs';
import { serve, serveWhileDeveloping } from './serve.mjs';
import { exitCodeForStop, listenForStop, stepUnlessStopped, stopSignal } from './stop-request.mjs';

const CLUSTER_FOLDER = inProject('.pg');
const CLUSTER_LOCK = inProject('.run', 'cluster.lock');
const PREPARING_LOCK = inProject('.run', 'preparing.lock');
const PORT_LOCK = inProject('.run', 'port.lock');
// A server that first fills an empty database with the demo laboratory may take this long before it listens.
const LISTENING_PATIENCE_MS = 120_000;
const DATABASE = 'hacklebook';

const develop = process.argv.includes('--develop');
const usesCluster = !process.env.DATABASE_URL;
const signal = stopSignal();
let server;

function say(sentence) {
  console.log(sentence);
}

function prepare() {
  return withLock(
    PREPARING_LOCK,
    async () => {
      await ensurePackages({ signal, say });
      if (!develop) await buildProduct({ signal, say });
    },
    { signal, say },
  );
}

/** Ends what a killed start left, and brings up the database; returns its address. */
function bringUpDatabase() {
  return withLock(
    CLUSTER_LOCK,
    async () => {
      await endServersLeftOver(say);
      noteStart({ usesCluster });
      if (!usesCluster) return process.env.DATABASE_URL;
      const cluster = await startCluster({ folder: CLUSTER_FOLDER, signal, say });
      await ensureDatabase(cluster, DATABASE, { folder: CLUSTER_FOLDER, signal, say });
      return cluster.url(DATABASE);
    },
    { signal, say },
  );
}

/** The last start to leave stops the project's cluster. */
function leave() {
  return withLock(
    CLUSTER_LOCK,
    async () => {
      const stillUsed = forgetStart();
      if (usesCluster && !stillUsed) await stopCluster(CLUSTER_FOLDER);
    },
    { patienceMs: 10_000 },
  );
}

/** Serves on a port chosen while no other start chooses, until the server ends or a stop is asked for. */
async function serveOn(host, databaseUrl) {
  const onBegin = (begun) => {
    server = begun;
    noteStart({ usesCluster, serverPid: begun.pid });
  };
  let serving;
  const begin = async () => {
    const port = await choosePort(host, say);
    const variables = {
      DATABASE_URL: databaseUrl,
      HOST: host,
      PORT: String(port),
      HACKLEBOOK_UPLOADS: process.env.HACKLEBOOK_UPLOADS || inProject('uploads'),
      HACKLEBOOK_SECRET: process.env.HACKLEBOOK_SECRET || keptSecret(inProject('.run', 'session-secret')),
    };
    serving = (develop ? serveWhileDeveloping : serve)({ variables, onBegin, say });
    const ended = serving.catch(() => undefined);
    await untilAnswers(port, { host, ended, patienceMs: LISTENING_PATIENCE_MS });
  };
  await withLock(PORT_LOCK, begin, { signal, say });
  await serving;
}

async function run() {
  requireNode();
  mkdirSync(inProject('.run'), { recursive: true });
  await prepare();
  try {
    const databaseUrl = await bringUpDatabase();
    stepUnlessStopped();
    await serveOn(process.env.HOST || '127.0.0.1', databaseUrl);
  } finally {
    await leave();
  }
}

listenForStop(() => server?.kill());
try {
  await run();
  process.exitCode = 0;
} catch (error) {
  const asked = signal.aborted && !(error instanceof Failure);
  process.exitCode = asked ? exitCodeForStop() : (error?.exitCode ?? 1);
  if (!asked) console.error(`\n${sentencesFor(error)}`);
}
