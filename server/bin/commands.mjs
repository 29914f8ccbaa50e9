import { spawn } from 'node:child_process';
import { Failure } from './failure.mjs';

/** The environment without PostgreSQL's own variables: an empty PGPORT alone makes initdb fail. */
export function cleanEnvironment(additions = {}) {
  const entries = Object.entries(process.env).filter(([name]) => !name.startsWith('PG'));
  return { ...Object.fromEntries(entries), ...additions };
}

/** Ends a program together with everything it started; it must have been started in a group of its own. */
export function signalGroup(child, signalName) {
  if (child.pid === undefined) return;
  try {
    process.kill(-child.pid, signalName);
  } catch {
    // The group has gone already, which is what was wanted.
  }
}

/**
 * Runs a program to its end and gathers what it printed.
 * @param {string} program
 * @param {string[]} parameters
 * @param {{ cwd?: string, env?: object, input?: string, signal?: AbortSignal, show?: boolean }} options
 *   `show` passes the output on at once; `signal` ends the program with all it started.
 * @returns {Promise<{ code: number, output: string }>}
 * @throws {Failure} when the program cannot be started; the signal's reason when it was ended by the signal.
 */
export function runCommand(program, parameters, { cwd, env = cleanEnvironment(), input, signal, show = false } = {}) {
  return new Promise((resolve, reject) => {
    signal?.throwIfAborted();
    const child = spawn(program, parameters, { cwd, env, detached: true, stdio: ['pipe', 'pipe', 'pipe'] });
    const parts = [];
    const end = () => signalGroup(child, 'SIGTERM');
    signal?.addEventListener('abort', end, { once: true });
    for (const [stream, target] of [
      [child.stdout, process.stdout],
      [child.stderr, process.stderr],
    ]) {
      // prettier-ignore
      stream.on('data', (part) => {
        parts.push(part);
        if (show) target.write(part);
      });
    }
    child.on('error', (error) => {
      signal?.removeEventListener('abort', end);
      reject(new Failure(`The program ${program} could not be started (${error.code}).`));
    });
    child.on('close', (code) => {
      signal?.removeEventListener('abort', end);
      if (signal?.aborted) reject(signal.reason);
      else resolve({ code: code ?? 1, output: Buffer.concat(parts).toString('utf8') });
    });
    child.stdin.on('error', () => undefined);
    child.stdin.end(input);
  });
}

const COLOUR = new RegExp(`${String.fromCharCode(27)}\\[[0-9;]*m`, 'g');
const STACK_BEGIN = /\n\s+at .*:\d+:\d+/;

/** The last lines of a program's output before any stack trace, without colours, for a failure's message. */
export function lastLines(output, count = 15) {
  const [told] = output.replace(COLOUR, '').split(STACK_BEGIN);
  return told.trim().split('\n').slice(-count).join('\n');
}
