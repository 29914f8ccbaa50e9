import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';

export type ServerProcess = {
  readonly address: string;
  readonly pid: number;
  /** Ends it at once, as a power cut would. */
  kill(): Promise<void>;
  /** Asks it to stop in order. */
  stop(): Promise<void>;
};

/** Starts the server as a process of its own, from its sources, and waits until it says where it is. */
export async function startServerProcess(environment: Record<string, string>): Promise<ServerProcess> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'tests/support/serve-routes.ts'], {
    env: {
      PATH: process.env.PATH,
      PORT: '0',
      HACKLEBOOK_SECRET: 'only for tests, only for tests, only for tests',
      HACKLEBOOK_DEMO: 'no',
      LOG_LEVEL: 'error',
      ...environment,
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const address = await addressSaid(child);
  const end = async (signal: 'SIGKILL' | 'SIGTERM') => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill(signal);
    await once(child, 'exit');
  };
  return { address, pid: child.pid ?? 0, kill: () => end('SIGKILL'), stop: () => end('SIGTERM') };
}

async function addressSaid(child: ChildProcess): Promise<string> {
  let said = '';
  for await (const chunk of child.stdout ?? []) {
    said += String(chunk);
    const [, address] = /Hacklebook is at (http\S+)/.exec(said) ?? [];
    if (address) {
      child.stdout?.resume();
      return address;
    }
  }
  throw new Error(`the server ended before it was ready: ${said}`);
}
