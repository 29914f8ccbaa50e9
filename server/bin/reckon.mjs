import { existsSync, mkdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { Failure, sentencesFor } from './failure.mjs';
import { withLock } from './lock.mjs';
import { requireNode } from './node-version.mjs';
import { ensurePackages } from './packages.mjs';
import { inProject } from './project.mjs';

// Answers go to the standard output alone, so that another program can read them.
function say(sentence) {
  console.error(sentence);
}

function fileAsked() {
  const [file, ...more] = process.argv.slice(2);
  if (!file || more.length > 0) {
    throw new Failure('Name one file with a list of methods to reckon.', 'npm run --silent reckon -- FILE.json');
  }
  const path = resolve(process.env.INIT_CWD ?? '.', file);
  if (!existsSync(path)) throw new Failure(`There is no file ${path}.`);
  return path;
}

try {
  requireNode();
  const file = fileAsked();
  mkdirSync(inProject('.run'), { recursive: true });
  await withLock(inProject('.run', 'preparing.lock'), () => ensurePackages({ say }), { say });
  const { tsImport } = await import('tsx/esm/api');
  const { reckonFile } = await tsImport('../reckon-file.ts', import.meta.url);
  const read = reckonFile(file);
  if (read.kind === 'unreadable') throw new Failure(read.reason);
  process.stdout.write(`${JSON.stringify(read.reckonings, null, 2)}\n`);
} catch (error) {
  say(sentencesFor(error));
  process.exitCode = error.exitCode ?? 1;
}
