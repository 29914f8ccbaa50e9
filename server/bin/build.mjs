import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { cleanEnvironment, lastLines, runCommand } from './commands.mjs';
import { Failure } from './failure.mjs';
import { inProject } from './project.mjs';
import { bundleServer } from './server-bundle.mjs';
import { sourceStamp } from './source-stamp.mjs';

const COMMON_SOURCES = ['shared', 'package.json', 'package-lock.json', 'tsconfig.json'];
const CLIENT_SOURCES = [...COMMON_SOURCES, 'src', 'public', 'index.html', 'vite.config.ts', 'tailwind.config.ts'];
const SERVER_SOURCES = [...COMMON_SOURCES, 'server'];

async function buildWhenChanged({ name, sources, result, build }) {
  const stampFile = inProject('dist', `${name}.stamp`);
  const stamp = sourceStamp(sources);
  if (existsSync(result) && existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  mkdirSync(inProject('dist'), { recursive: true });
  rmSync(stampFile, { force: true });
  await build();
  writeFileSync(stampFile, stamp);
}

async function buildClient(signal) {
  const env = cleanEnvironment({ NODE_ENV: 'production' });
  const parameters = ['build', '--logLevel', 'warn'];
  const options = { cwd: inProject(), env, signal };
  const { code, output } = await runCommand(inProject('node_modules', '.bin', 'vite'), parameters, options);
  if (code === 0) return;
  throw new Failure(
    `The pages could not be built:\n${lastLines(output, 30)}`,
    'Mend the file named above, or go back to the last version that worked.',
  );
}

/**
 * Builds the pages into dist/client and the server into dist/server, each only when its sources have changed.
 * @param {{ signal?: AbortSignal, say: (sentence: string) => void }} options
 */
export async function buildProduct({ signal, say }) {
  await buildWhenChanged({
    name: 'client',
    sources: CLIENT_SOURCES,
    result: inProject('dist', 'client', 'index.html'),
    build: () => {
      say('Building the pages …');
      return buildClient(signal);
    },
  });
  signal?.throwIfAborted();
  await buildWhenChanged({
    name: 'server',
    sources: SERVER_SOURCES,
    result: inProject('dist', 'server', 'main.js'),
    build: () => {
      say('Building the server …');
      return bundleServer();
    },
  });
}
