import { existsSync, readdirSync } from 'node:fs';
import { cleanEnvironment, runCommand } from './commands.mjs';
import { installDebianPackages, refuseMainCluster } from './debian.mjs';
import { Failure } from './failure.mjs';

const DEBIAN_FOLDER = '/usr/lib/postgresql';

function majorsPresent() {
  if (!existsSync(DEBIAN_FOLDER)) return [];
  return readdirSync(DEBIAN_FOLDER)
    .filter((name) => ['initdb', 'pg_ctl', 'postgres'].every((p) => existsSync(`${DEBIAN_FOLDER}/${name}/bin/${p}`)))
    .map(Number)
    .filter(Number.isInteger)
    .sort((a, b) => b - a);
}

/**
 * The folder of PostgreSQL's programs; installs them only when there are none at all.
 * @param {{ major?: number, signal?: AbortSignal, say: (sentence: string) => void }} options
 *   `major` is the version a cluster already there was made with; without it the newest present is taken.
 */
export async function findPostgresPrograms({ major, signal, say }) {
  if (majorsPresent().length === 0) {
    if (process.getuid() === 0) refuseMainCluster();
    await installDebianPackages({ what: 'The PostgreSQL server', names: ['postgresql'], signal, say });
  }
  const present = majorsPresent();
  const chosen = major ?? present[0];
  if (!present.includes(chosen)) {
    throw new Failure(
      `Hacklebook's data were made with PostgreSQL ${chosen}, which is not on this machine.`,
      `Ask an administrator to run: sudo apt-get install -y --no-install-recommends postgresql-${chosen}`,
    );
  }
  return `${DEBIAN_FOLDER}/${chosen}/bin`;
}

/**
 * Runs one of PostgreSQL's programs. It refuses to run as root, so root hands it to the account that owns the data.
 * @param {{ programs: string, account?: string }} postgres
 */
export function runPostgres({ programs, account }, name, parameters, { signal, input } = {}) {
  const env = cleanEnvironment({ LC_ALL: 'C.UTF-8' });
  const command = [`${programs}/${name}`, ...parameters];
  const [program, ...rest] = account ? ['runuser', '-u', account, '--', ...command] : command;
  return runCommand(program, rest, { cwd: '/', env, signal, input });
}
