import { mkdirSync } from 'node:fs';
import { buildProduct } from './build.mjs';
import { ensureDatabase, startCluster, stopCluster } from './cluster.mjs';
import { Failure, sentencesFor } from './failure.mjs';
import { withLock } from './lock.mjs';
import { requireNode } from './node-version.mjs';
import { ensurePackages } from './packages.mjs';
import { freePortFrom } from './ports.mjs';
import { inProject } from './project.mjs';
import { endServersLeftOver, forgetStart, noteStart } from './running-starts.mjs';
import { serve, serveWhileDeveloping } from './serve.mjs';
import { exitCodeForStop, listenForStop, stepUnlessStopped, stopSignal } from './stop-request.mjs';

const CLUSTER_FOLDER = inProject('.pg');
const CLUSTER_LOCK = inProject('.run', 'cluster.lock');
const PREPARING_LOCK = inProject('.run', 'preparing.lock');
const DATABASE = 'hacklebook';
const USUAL_PORT = 3000;

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

async function choosePort(host) {
  const wanted = process.env.PORT ? Number(process.env.PORT) : USUAL_PORT;
  if (!Number.isInteger(wanted) || wanted < 1 || wanted > 65_535) {
    throw new Failure(`PORT is "${process.env.PORT}", which is not a port.`, 'Give a number from 1 to 65535.');
  }
  const port = await freePortFrom(wanted, host);
  if (port === undefined) {
    throw new Failure(`Port ${wanted} and the hundred after it are taken.`, 'Give another with PORT=…');
  }
  if (port !== wanted) say(`Port ${wanted} is taken; taking ${port} instead.`);
  return String(port);
}

async function run() {
  requireNode();
  mkdirSync(inProject('.run'), { recursive: true });
  await prepare();
  try {
    const databaseUrl = await bringUpDatabase();
    stepUnlessStopped();
    const host = process.env.HOST || '127.0.0.1';
    const variables = {
      DATABASE_URL: databaseUrl,
      HOST: host,
      PORT: await choosePort(host),
      HACKLEBOOK_UPLOADS: process.env.HACKLEBOOK_UPLOADS || inProject('uploads'),
    };
    const onBegin = (begun) => {
      server = begun;
      noteStart({ usesCluster, serverPid: begun.pid });
    };
    await (develop ? serveWhileDeveloping : serve)({ variables, onBegin, say });
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
