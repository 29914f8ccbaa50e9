import { createHash } from 'node:crypto';
import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from './project.mjs';

const NOT_SOURCES = /\.test\.\w+$|~$|\.swp$/;

function filesUnder(path) {
  const found = statSync(path, { throwIfNoEntry: false });
  if (!found) return [];
  if (!found.isDirectory()) return [`${path} ${found.size} ${found.mtimeMs}`];
  return readdirSync(path)
    .sort()
    .flatMap((name) => (NOT_SOURCES.test(name) ? [] : filesUnder(join(path, name))));
}

/** A short text that changes when any file under these paths of the project comes, goes or changes; tests apart. */
export function sourceStamp(paths) {
  const lines = paths.flatMap((path) => filesUnder(join(projectFolder, path)));
  return createHash('sha256').update(lines.join('\n')).digest('hex');
}
