import { existsSync, statSync } from 'node:fs';
import { dirname } from 'node:path';
import { cleanEnvironment, runCommand } from './commands.mjs';
import { Failure } from './failure.mjs';

async function ask(program, parameters) {
  const { code, output } = await runCommand(program, parameters, { cwd: '/', env: cleanEnvironment() });
  return code === 0 ? output.trim() : undefined;
}

/**
 * The account PostgreSQL must run as for this data folder: the owner of the data, or `postgres` for new data.
 * Undefined when that is the person who called, who needs no other.
 */
export async function accountFor(dataFolder) {
  const owner = existsSync(dataFolder) ? statSync(dataFolder).uid : undefined;
  const self = process.getuid();
  if (self !== 0) {
    if (owner === undefined || owner === self) return undefined;
    throw new Failure(
      `The data in ${dataFolder} belong to another user; Hacklebook was started before as that user or as root.`,
      'Start it as before, or set DATABASE_URL to a PostgreSQL server of your own.',
    );
  }
  const name = owner ? await ask('id', ['-nu', String(owner)]) : 'postgres';
  if (name && (await ask('id', ['-u', name])) !== undefined) return name;
  throw new Failure(
    'PostgreSQL refuses to run as root, and the user it should run as does not exist on this machine.',
    'Create it as root with: useradd --system --shell /bin/bash postgres',
  );
}

/** Refuses a folder the account cannot enter, naming the first folder on the way that bars it. */
export async function requireEnterable(folder, account) {
  if (!account) return;
  const way = [folder];
  while (dirname(way[0]) !== way[0]) way.unshift(dirname(way[0]));
  for (const step of way) {
    if ((await ask('runuser', ['-u', account, '--', 'test', '-x', step])) !== undefined) continue;
    throw new Failure(
      `PostgreSQL runs as the user ${account}, who may not enter ${step}, so it cannot keep data in ${folder}.`,
      `Move the project to a folder others may enter, such as /srv/hacklebook, or run: chmod o+x ${step}`,
    );
  }
}
