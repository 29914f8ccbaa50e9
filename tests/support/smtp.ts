import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

export type Received = { to: string[]; text: string };

/** A mail server on this machine that keeps what it gets; `refuse` may answer an address with a reply code. */
export async function startSmtp(refuse: (to: string, attempt: number) => number | null = () => null) {
  const received: Received[] = [];
  let attempts = 0;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onRcptTo: ({ address }, _session, done) => {
      attempts += 1;
      const code = refuse(address, attempts);
      done(code === null ? null : Object.assign(new Error('no such box'), { responseCode: code }));
    },
    onData: (stream, session, done) => {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => {
        received.push({
          to: session.envelope.rcptTo.map(({ address }) => address),
          text: Buffer.concat(parts).toString(),
        });
        done();
      });
    },
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const { port } = server.server.address() as AddressInfo; // brand: a server listening on a port has one
  return {
    url: `smtp://127.0.0.1:${port}`,
    received,
    stop: () => new Promise<void>((done) => server.close(done)),
  };
}
