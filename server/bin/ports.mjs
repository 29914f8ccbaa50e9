import { connect, createServer } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';

function listenOnce(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host }, () => {
      const { port: taken } = server.address();
      server.close(() => resolve(taken));
    });
  });
}

/** A port nobody listens on at the moment. */
export function anyFreePort(host = '127.0.0.1') {
  return listenOnce(0, host);
}

/** The wanted port, or the next one up that is free; undefined when a hundred in a row are taken. */
export async function freePortFrom(wanted, host) {
  for (let port = wanted; port < Math.min(wanted + 100, 65_536); port += 1) {
    try {
      return await listenOnce(port, host);
    } catch (error) {
      if (error.code !== 'EADDRINUSE' && error.code !== 'EACCES') throw error;
    }
  }
  return undefined;
}

/** Whether something on this machine takes a connection on the port. */
export function answers(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const socket = connect({ port, host: host === '0.0.0.0' ? '127.0.0.1' : host });
    const finish = (answer) => {
      socket.destroy();
      resolve(answer);
    };
    socket.setTimeout(2000, () => finish(false));
    socket.once('connect', () => finish(true));
    socket.once('error', () => finish(false));
  });
}

/** Waits until something answers on the port, `ended` comes to pass, or the patience is over. */
export async function untilAnswers(port, { host, ended, patienceMs }) {
  let over = false;
  void ended.then(() => (over = true));
  const until = Date.now() + patienceMs;
  while (!over && Date.now() < until && !(await answers(port, host))) await wait(100);
}
