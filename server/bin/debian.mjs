import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { cleanEnvironment, lastLines, runCommand } from './commands.mjs';
import { Failure } from './failure.mjs';

const LISTS = '/var/lib/apt/lists';

function hasPackageLists() {
  return existsSync(LISTS) && readdirSync(LISTS).some((name) => /_Packages(\.\w+)?$/.test(name));
}

function apt(parameters, signal) {
  const env = cleanEnvironment({ DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' });
  return runCommand('apt-get', ['-o', 'DPkg::Lock::Timeout=300', ...parameters], { cwd: '/', env, signal });
}

/** Keeps Debian from making a cluster "main" of its own when the PostgreSQL server is installed. */
export function refuseMainCluster(folder = '/etc/postgresql-common') {
  const file = `${folder}/createcluster.conf`;
  mkdirSync(folder, { recursive: true });
  const present = existsSync(file) ? readFileSync(file, 'utf8') : '';
  if (/^\s*create_main_cluster\s*=\s*false/m.test(present)) return;
  writeFileSync(file, `${present}${present && !present.endsWith('\n') ? '\n' : ''}create_main_cluster = false\n`);
}

/**
 * Installs Debian packages as root, or says which command an administrator should run.
 * @param {{ what: string, names: string[], signal?: AbortSignal, say: (sentence: string) => void }} wanted
 *   `what` names in plain words what is missing.
 */
export async function installDebianPackages({ what, names, signal, say }) {
  const command = `apt-get install -y --no-install-recommends ${names.join(' ')}`;
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Failure(`${what} is missing, and this is not a Debian system.`, `Install it here: ${names.join(', ')}.`);
  }
  if (process.getuid() !== 0) {
    throw new Failure(`${what} is missing on this machine.`, `Ask an administrator to run: sudo ${command}`);
  }
  say(`Installing ${names.join(', ')} with apt-get …`);
  const install = ['-o', 'Dpkg::Options::=--force-confold', 'install', '-y', '--no-install-recommends', ...names];
  if (!hasPackageLists()) await apt(['update'], signal);
  let result = await apt(install, signal);
  if (result.code !== 0) {
    // Lists that are too old name files the mirror no longer has.
    await apt(['update'], signal);
    result = await apt(install, signal);
  }
  if (result.code !== 0) {
    throw new Failure(
      `apt-get could not install ${names.join(', ')}:\n${lastLines(result.output)}`,
      `Check the network, or run as root: apt-get update && ${command}`,
    );
  }
}
