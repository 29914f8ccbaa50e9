import { Failure } from './failure.mjs';

const OLDEST = [20, 19];

/** Refuses a Node older than the oldest that the packages run on. */
export function requireNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  if (major > OLDEST[0] || (major === OLDEST[0] && minor >= OLDEST[1])) return;
  throw new Failure(
    `Hacklebook needs Node ${OLDEST.join('.')} or newer; this is Node ${version}.`,
    'Install a newer Node (see https://nodejs.org) and start again.',
  );
}
