import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { cleanEnvironment, runCommand } from '../../server/bin/commands.mjs';
import { inProject } from '../../server/bin/project.mjs';
import { countTests } from './count-tests.mjs';

// The whole of the tests has twenty minutes; what hangs must still leave time for the count.
const LONGEST_MS = 16 * 60_000;

function readReport(file) {
  try {
    return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined;
  } catch {
    return undefined;
  }
}

async function runUntilEnd(parameters, { pgUrl, signal, say }) {
  const limit = AbortSignal.timeout(LONGEST_MS);
  const env = cleanEnvironment({ HACKLEBOOK_TEST_PG: pgUrl, NODE_ENV: 'test' });
  try {
    const options = { cwd: inProject(), env, signal: AbortSignal.any([signal, limit]), show: true };
    return (await runCommand(process.execPath, parameters, options)).code;
  } catch (error) {
    if (signal.aborted || !limit.aborted) throw error;
    say(`The tests were ended after ${LONGEST_MS / 60_000} minutes.`);
    return 1;
  }
}

/**
 * Runs the tests of these projects and counts them.
 * @param {{ projects: string[], paths: string[] }} choice
 * @param {{ pgUrl: string, signal: AbortSignal, say: (sentence: string) => void }} options
 */
export async function runVitest({ projects, paths }, { pgUrl, signal, say }) {
  const folder = mkdtempSync(join(tmpdir(), 'hacklebook-report-'));
  const file = join(folder, 'report.json');
  const parameters = [
    inProject('node_modules', 'vitest', 'vitest.mjs'),
    'run',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${file}`,
    ...projects.flatMap((name) => ['--project', name]),
    ...paths,
  ];
  try {
    const code = await runUntilEnd(parameters, { pgUrl, signal, say });
    const count = countTests(readReport(file), code);
    for (const remark of count.remarks) say(`✗ ${remark}`);
    return count;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
