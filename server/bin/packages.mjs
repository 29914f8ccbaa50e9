import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { cleanEnvironment, lastLines, runCommand } from './commands.mjs';
import { Failure } from './failure.mjs';
import { inProject } from './project.mjs';

const LOCKFILE = inProject('package-lock.json');
const INSTALLED = inProject('node_modules', '.package-lock.json');
const STAMP = inProject('node_modules', '.hacklebook-packages');

function wantedHash() {
  const source = existsSync(LOCKFILE) ? LOCKFILE : inProject('package.json');
  return createHash('sha256').update(readFileSync(source)).digest('hex');
}

/** Whether npm's own record of what it installed names every package of the lockfile in its version. */
export function matchesLockfile(lockfile, installed) {
  return Object.entries(lockfile.packages).every(([path, wanted]) => {
    if (path === '' || wanted.optional) return true;
    return installed.packages[path]?.version === wanted.version;
  });
}

function areCurrent(hash) {
  if (!existsSync(INSTALLED)) return false;
  if (existsSync(STAMP) && readFileSync(STAMP, 'utf8') === hash) return true;
  if (!existsSync(LOCKFILE)) return false;
  return matchesLockfile(JSON.parse(readFileSync(LOCKFILE, 'utf8')), JSON.parse(readFileSync(INSTALLED, 'utf8')));
}

/**
 * Installs the npm packages when they are missing or are not those of the lockfile.
 * @param {{ signal?: AbortSignal, say: (sentence: string) => void }} options
 */
export async function ensurePackages({ signal, say }) {
  const hash = wantedHash();
  if (!areCurrent(hash)) {
    say('Installing the npm packages; this takes about a minute …');
    const act = existsSync(LOCKFILE) ? 'ci' : 'install';
    const parameters = [act, '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
    const { code, output } = await runCommand('npm', parameters, { cwd: inProject(), env: cleanEnvironment(), signal });
    if (code !== 0) {
      throw new Failure(
        `npm could not install the packages:\n${lastLines(output)}`,
        `Check the network and the free disk space, or run "npm ${act}" yourself to see more.`,
      );
    }
  }
  writeFileSync(STAMP, hash);
}
