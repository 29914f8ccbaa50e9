import { existsSync, readdirSync } from 'node:fs';
import { cleanEnvironment, lastLines, runCommand } from '../../server/bin/commands.mjs';
import { Failure, sentencesFor } from '../../server/bin/failure.mjs';
import { requireNode } from '../../server/bin/node-version.mjs';
import { ensurePackages } from '../../server/bin/packages.mjs';
import { inProject } from '../../server/bin/project.mjs';
import { exitCodeForStop, listenForStop, stopSignal } from '../../server/bin/stop-request.mjs';
import { startTestCluster } from '../../server/bin/test-cluster.mjs';

const FOLDER = inProject('tests', 'bench');
const RUNNER = inProject('tests', 'bin', 'bench-one.mjs');
const signal = stopSignal();

function say(sentence) {
  console.log(sentence);
}

function chosenFiles(words) {
  const all = existsSync(FOLDER) ? readdirSync(FOLDER).filter((name) => name.endsWith('.bench.ts')) : [];
  const chosen = all.filter((name) => words.length === 0 || words.some((word) => name.includes(word))).sort();
  if (chosen.length > 0) return chosen;
  throw new Failure('There is nothing to measure.', `Measurements are files named NAME.bench.ts in ${FOLDER}.`);
}

async function measure(file, pgUrl) {
  const env = cleanEnvironment({ HACKLEBOOK_TEST_PG: pgUrl, NODE_ENV: 'production' });
  const parameters = ['--import', 'tsx', RUNNER, `${FOLDER}/${file}`];
  const { code, output } = await runCommand(process.execPath, parameters, { cwd: inProject(), env, signal });
  if (code === 0) say(`\n${output.trimEnd()}`);
  else say(`\n✗ ${file} failed:\n${lastLines(output)}`);
  return code === 0;
}

async function run() {
  requireNode();
  const files = chosenFiles(process.argv.slice(2));
  await ensurePackages({ signal, say });
  const cluster = await startTestCluster({ signal, say });
  try {
    let failures = 0;
    for (const file of files) failures += (await measure(file, cluster.url)) ? 0 : 1;
    if (failures > 0) throw new Failure(`${failures} of ${files.length} measurements failed.`);
  } finally {
    await cluster.stop();
  }
}

listenForStop();
try {
  await run();
} catch (error) {
  const asked = signal.aborted && !(error instanceof Failure);
  process.exitCode = asked ? exitCodeForStop() : 1;
  if (!asked) console.error(`\n${sentencesFor(error)}`);
}
