import { chownSync, existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import {
  clearForeignNote,
  clusterFiles,
  keptPassword,
  majorOfData,
  prepareFolder,
  readPostmaster,
  trimLog,
} from './cluster-files.mjs';
import { cleanEnvironment, lastLines, runCommand } from './commands.mjs';
import { Failure } from './failure.mjs';
import { anyFreePort, answers } from './ports.mjs';
import { accountFor, requireEnterable } from './postgres-account.mjs';
import { findPostgresPrograms, runPostgres } from './postgres-programs.mjs';

const USER = 'app';
const LOOPBACK_ONLY = ['-c listen_addresses=127.0.0.1', "-c unix_socket_directories=''"];
// Speed for data that nobody will miss; never for data that matter.
const FORGETFUL = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'wal_level=minimal', 'max_wal_senders=0', 'max_connections=200']; // prettier-ignore
const START_ATTEMPTS = 6;

async function userId(account) {
  if (!account) return undefined;
  return Number((await runCommand('id', ['-u', account], { cwd: '/' })).output);
}

async function makeData(postgres, files, { forTests, password, ownerId, signal }) {
  rmSync(files.making, { recursive: true, force: true });
  const common = ['-D', files.making, '-U', USER, '-E', 'UTF8', '--locale=C.UTF-8'];
  writeFileSync(files.seal, `${password}\n`, { mode: 0o600 });
  if (ownerId !== undefined) chownSync(files.seal, ownerId, -1);
  const kind = forTests
    ? ['-A', 'trust', '--no-sync']
    : ['-A', 'scram-sha-256', '--pwfile', files.seal, '--data-checksums'];
  const { code, output } = await runPostgres(postgres, 'initdb', [...common, ...kind], { signal });
  rmSync(files.seal, { force: true });
  if (code !== 0) throw new Failure(`PostgreSQL could not make its data folder:\n${lastLines(output)}`);
  // Renamed only when whole, so that a start cut off half-way leaves nothing that looks like data.
  renameSync(files.making, files.data);
}

/** The port of the server that runs on these data and answers; undefined when none does. */
async function runningPort(postgres, files) {
  for (let attempt = 0; attempt < 50; attempt += 1) {
    const { code } = await runPostgres(postgres, 'pg_ctl', ['-D', files.data, 'status']);
    if (code !== 0) return undefined;
    const noted = readPostmaster(files);
    if (noted?.port && (await answers(noted.port))) return noted.port;
    await wait(100);
  }
  // For seconds "running", yet nobody answers: the number in the note belongs to some other program by now.
  clearForeignNote(files);
  return undefined;
}

async function startServer(postgres, files, { forTests, signal }) {
  let output = '';
  for (let attempt = 0; attempt < START_ATTEMPTS; attempt += 1) {
    signal?.throwIfAborted();
    const running = await runningPort(postgres, files);
    if (running) return running;
    const port = await anyFreePort();
    const settings = [`-p ${port}`, ...LOOPBACK_ONLY, ...(forTests ? FORGETFUL.map((setting) => `-c ${setting}`) : [])];
    const parameters = ['-D', files.data, '-l', files.log, '-w', '-t', '60', '-o', settings.join(' '), 'start'];
    const result = await runPostgres(postgres, 'pg_ctl', parameters, { signal });
    if (result.code === 0) return port;
    output = result.output;
    // The remains of a killed server may still be ending, or the port was taken in between.
    await wait(500);
  }
  const log = existsSync(files.log) ? lastLines(readFileSync(files.log, 'utf8')) : lastLines(output);
  throw new Failure(
    `PostgreSQL did not start:\n${log}`,
    `The whole log is in ${files.log}. Mend what it names and start again; the data are left as they are.`,
  );
}

/**
 * Starts a PostgreSQL server of Hacklebook's own on loopback, or finds the one already running on the same data.
 * @param {{ folder: string, forTests?: boolean, signal?: AbortSignal, say: (sentence: string) => void }} options
 *   `folder` must belong to Hacklebook alone; `forTests` gives a fast server without passwords that may lose data.
 * @returns {Promise<{ port: number, url: (database: string) => string, stop: () => Promise<void> }>}
 */
export async function startCluster({ folder, forTests = false, signal, say }) {
  const files = clusterFiles(folder);
  const programs = await findPostgresPrograms({ major: majorOfData(files), signal, say });
  const account = await accountFor(files.data);
  const ownerId = await userId(account);
  prepareFolder(folder, ownerId);
  await requireEnterable(folder, account);
  const postgres = { programs, account };
  const password = forTests ? '' : keptPassword(files);
  if (majorOfData(files) === undefined) await makeData(postgres, files, { forTests, password, ownerId, signal });
  trimLog(files);
  const port = await startServer(postgres, files, { forTests, signal });
  const login = password ? `${USER}:${password}` : USER;
  return {
    port,
    url: (database) => `postgres://${login}@127.0.0.1:${port}/${database}`,
    stop: () => stopCluster(folder, postgres),
  };
}

/** Stops the server on this folder's data, if one runs; the data stay. */
export async function stopCluster(folder, known) {
  const files = clusterFiles(folder);
  if (majorOfData(files) === undefined) return;
  const postgres = known ?? {
    programs: await findPostgresPrograms({ major: majorOfData(files), say: () => undefined }),
    account: await accountFor(files.data),
  };
  await runPostgres(postgres, 'pg_ctl', ['-D', files.data, '-m', 'fast', '-w', '-t', '20', 'stop']);
}

/** Makes the database unless it is there. */
export async function ensureDatabase(cluster, name, { folder, signal, say }) {
  const programs = await findPostgresPrograms({ major: majorOfData(clusterFiles(folder)), signal, say });
  const env = cleanEnvironment({ LC_ALL: 'C.UTF-8' });
  const psql = (sql) => runCommand(`${programs}/psql`, ['-XtAqd', cluster.url('postgres'), '-c', sql], { env, signal });
  const found = await psql(`select 1 from pg_database where datname = '${name}'`);
  if (found.output.trim() === '1') return;
  const made = await psql(`create database ${name}`);
  if (made.code !== 0 && !made.output.includes('already exists')) {
    throw new Failure(`The database ${name} could not be made:\n${lastLines(made.output)}`);
  }
}
