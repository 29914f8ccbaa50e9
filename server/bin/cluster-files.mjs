import { randomBytes } from 'node:crypto';
import { chownSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Failure } from './failure.mjs';

const LARGEST_LOG_BYTES = 10_000_000;

/** Where the parts of a cluster lie in its folder. */
export function clusterFiles(folder) {
  const at = (name) => join(folder, name);
  return {
    data: at('data'),
    making: at('data.making'),
    log: at('postgres.log'),
    password: at('password'),
    seal: at('pw'),
  };
}

/** The PostgreSQL version the data were made with; undefined when there are none yet. */
export function majorOfData(files) {
  const file = join(files.data, 'PG_VERSION');
  return existsSync(file) ? Number(readFileSync(file, 'utf8')) : undefined;
}

/** Number and port from the running server's own note; undefined without one. */
export function readPostmaster(files) {
  const file = join(files.data, 'postmaster.pid');
  if (!existsSync(file)) return undefined;
  const lines = readFileSync(file, 'utf8').split('\n');
  return { pid: Number(lines[0]), port: Number(lines[3]) };
}

/** Removes the note of a server that was killed, when its number now belongs to some other program. */
export function clearForeignNote(files) {
  const noted = readPostmaster(files);
  if (!noted || !existsSync('/proc/self')) return;
  const commandLine = `/proc/${noted.pid}/cmdline`;
  const isOurs = existsSync(commandLine) && readFileSync(commandLine, 'utf8').split('\0').includes(files.data);
  if (!isOurs) rmSync(join(files.data, 'postmaster.pid'), { force: true });
}

/** The kept password of the database user; made and written before the first data. */
export function keptPassword(files) {
  if (!existsSync(files.password)) {
    if (existsSync(files.data)) {
      throw new Failure(
        `The password of Hacklebook's database, ${files.password}, is missing.`,
        `Put the file back, or move ${files.data} away to begin with an empty Hacklebook.`,
      );
    }
    writeFileSync(`${files.password}.new`, randomBytes(24).toString('hex'), { mode: 0o600 });
    renameSync(`${files.password}.new`, files.password);
  }
  return readFileSync(files.password, 'utf8').trim();
}

/** Makes the cluster's folder and gives it to the account that PostgreSQL runs as. */
export function prepareFolder(folder, ownerId) {
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  if (ownerId !== undefined) chownSync(folder, ownerId, -1);
}

/** Begins the log afresh when it has grown beyond use. */
export function trimLog(files) {
  if (existsSync(files.log) && statSync(files.log).size > LARGEST_LOG_BYTES) rmSync(files.log);
}
