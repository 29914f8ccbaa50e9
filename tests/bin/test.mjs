import { mkdirSync } from 'node:fs';
import { buildProduct } from '../../server/bin/build.mjs';
import { Failure, sentencesFor } from '../../server/bin/failure.mjs';
import { withLock } from '../../server/bin/lock.mjs';
import { requireNode } from '../../server/bin/node-version.mjs';
import { ensurePackages } from '../../server/bin/packages.mjs';
import { inProject } from '../../server/bin/project.mjs';
import { exitCodeForStop, listenForStop, stopSignal } from '../../server/bin/stop-request.mjs';
import { startTestCluster } from '../../server/bin/test-cluster.mjs';
import { runChecks } from './checks.mjs';
import { readChoice } from './choice.mjs';
import { ensureTools } from './tools.mjs';
import { runVitest } from './vitest-run.mjs';

const signal = stopSignal();
const total = { passed: 0, failed: 0, skipped: 0 };

function say(sentence) {
  console.log(sentence);
}

function add({ passed = 0, failed = 0, skipped = 0 }) {
  total.passed += passed;
  total.failed += failed;
  total.skipped += skipped;
}

/** Does one part of the run; its failure is told and counted, and the parts after it go on. */
async function part(act) {
  try {
    return await act();
  } catch (error) {
    if (signal.aborted && !(error instanceof Failure)) throw error;
    say(`✗ ${sentencesFor(error)}`);
    add({ failed: 1 });
    return undefined;
  }
}

function prepare(act) {
  mkdirSync(inProject('.run'), { recursive: true });
  return withLock(inProject('.run', 'preparing.lock'), act, { signal, say });
}

/** What the browser tests need; returns whether it is all there. */
async function prepareJourneys() {
  const ready = await part(async () => {
    await ensureTools({ signal, say });
    await prepare(() => buildProduct({ signal, say }));
    return true;
  });
  if (!ready) say('The browser tests are left out, because the product they use could not be made ready.');
  return ready === true;
}

async function runTests({ projects, paths }) {
  const ready = projects.includes('journeys') && (await prepareJourneys());
  const runnable = projects.filter((name) => name !== 'journeys' || ready);
  if (runnable.length === 0) return;
  const needsCluster = runnable.some((name) => name !== 'unit');
  const cluster = needsCluster ? await startTestCluster({ signal, say }) : undefined;
  try {
    add(await runVitest({ projects: runnable, paths }, { pgUrl: cluster?.url ?? '', signal, say }));
  } finally {
    await cluster?.stop();
  }
}

async function run() {
  requireNode();
  const choice = readChoice(process.argv.slice(2));
  await prepare(() => ensurePackages({ signal, say }));
  add(await runChecks(choice.checks, { signal, say }));
  if (choice.projects.length > 0) await part(() => runTests(choice));
}

listenForStop();
try {
  await part(run);
  if (total.passed + total.failed === 0) {
    say('✗ Nothing was tested.');
    total.failed = 1;
  }
  process.exitCode = total.failed === 0 ? 0 : 1;
} catch {
  say('The tests were stopped before their end.');
  total.failed += 1;
  process.exitCode = exitCodeForStop();
}
console.log(`${total.passed} passed, ${total.failed} failed, ${total.skipped} skipped`);
