import { spawn } from 'node:child_process';
import { cleanEnvironment, signalGroup } from './commands.mjs';
import { inProject } from './project.mjs';

// What the server may take to end its requests and keep what is being written, before it is ended by force.
const GRACE_MS = 8000;

/**
 * Begins the server as a process of its own, apart from the terminal, so that Ctrl-C reaches it once, through us.
 * @param {{ develop: boolean, variables: object }} options `variables` are added to its environment
 */
export function beginServer({ develop, variables }) {
  const parameters = develop ? ['--import', 'tsx', 'server/main.ts'] : ['dist/server/main.js'];
  const env = cleanEnvironment({ ...variables, NODE_ENV: develop ? 'development' : 'production' });
  const options = { cwd: inProject(), env, detached: true, stdio: ['ignore', 'inherit', 'inherit'] };
  const child = spawn(process.execPath, parameters, options);
  const ended = new Promise((resolve) => {
    child.on('error', () => resolve(1));
    child.on('exit', (code) => {
      signalGroup(child, 'SIGKILL');
      resolve(code ?? 1);
    });
  });
  return {
    pid: child.pid,
    /** Resolves with the exit code, 1 when it was ended by force. */
    ended,
    kill: () => signalGroup(child, 'SIGKILL'),
    stop: async () => {
      child.kill('SIGTERM');
      const force = setTimeout(() => signalGroup(child, 'SIGKILL'), GRACE_MS);
      const code = await ended;
      clearTimeout(force);
      return code;
    },
  };
}
