import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

/** The secret that signs sessions on this machine, kept so that people stay signed in over a restart. */
export function keptSecret(file) {
  if (!existsSync(file)) {
    writeFileSync(`${file}.new`, randomBytes(32).toString('hex'), { mode: 0o600 });
    renameSync(`${file}.new`, file);
  }
  return readFileSync(file, 'utf8').trim();
}
