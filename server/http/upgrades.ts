import type { IncomingMessage, Server } from 'node:http';
import { ServerResponse } from 'node:http';
import type { Duplex } from 'node:stream';
import type { RequestHandler, Request, Response } from 'express';
import type { Person } from '#shared/contracts/people.ts';

/** Takes over a socket of the path it was put down for; the person has been read from the session. */
export type UpgradeHandler = (request: IncomingMessage, socket: Duplex, head: Buffer, person: Person) => void;

/**
 * Lets signed-in people of this very site open sockets: the path's first part below /sockets picks the handler.
 * Anything else on /sockets is refused; other paths are left alone for whoever else listens.
 */
export function acceptUpgrades(
  server: Server,
  sessions: readonly RequestHandler[],
  handlers: Readonly<Record<string, UpgradeHandler>>,
) {
  let open = true;
  server.on('upgrade', (request, socket, head) => {
    const path = new URL(request.url ?? '/', 'http://here').pathname;
    const [, room, name] = path.split('/');
    if (room !== 'sockets') return;
    const handler = handlers[name];
    if (!open || !handler || !isSameSite(request)) return refuse(socket, '403 Forbidden');
    readPerson(request, sessions).then(
      (person) => (person ? handler(request, socket, head, person) : refuse(socket, '401 Unauthorized')),
      () => refuse(socket, '503 Service Unavailable'),
    );
  });
  return { stop: () => (open = false) };
}

function isSameSite(request: IncomingMessage): boolean {
  const origin = request.headers.origin;
  return origin !== undefined && URL.canParse(origin) && new URL(origin).host === request.headers.host;
}

/** Runs the session layers on a request that never becomes an Express one. */
async function readPerson(request: IncomingMessage, sessions: readonly RequestHandler[]): Promise<Person | null> {
  const asRequest = request as Request; // brand: the session layers read only headers and set session and user
  const asResponse = new ServerResponse(request) as Response;
  for (const layer of sessions) {
    await new Promise<void>((done, fail) => {
      void layer(asRequest, asResponse, (error: unknown) => (error ? fail(error) : done()));
    });
  }
  return asRequest.user ?? null;
}

function refuse(socket: Duplex, status: string): void {
  socket.end(`HTTP/1.1 ${status}\r\nConnection: close\r\nContent-Length: 0\r\n\r\n`);
}
