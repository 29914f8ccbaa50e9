import { readFileSync } from 'node:fs';

/** Start time and state of a process; process numbers are given again after a restart, the pair is not. */
function lookUp(pid) {
  try {
    const fields = readFileSync(`/proc/${pid}/stat`, 'utf8')
      .replace(/^.*\) /s, '')
      .split(' ');
    return { state: fields[0], startedAt: fields[19] };
  } catch {
    return undefined;
  }
}

/** A name for a process that no later process will bear: `pid-start`. */
export function identityOf(pid) {
  return `${pid}-${lookUp(pid)?.startedAt ?? 0}`;
}

/** The process number in an identity. */
export function pidOf(identity) {
  return Number(identity.split('-')[0]);
}

/** Whether the very process so named still runs; one that has ended but not been collected does not. */
export function isAlive(identity) {
  const [pid, startedAt] = identity.split('-');
  const found = lookUp(Number(pid));
  return found !== undefined && found.state !== 'Z' && found.startedAt === startedAt;
}
