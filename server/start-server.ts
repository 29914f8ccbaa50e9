import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { fileURLToPath } from 'node:url';
import type { Express } from 'express';
import { pino } from 'pino';
import { allTasks } from './all-tasks.ts';
import { answerProblem, makeApp } from './app.ts';
import { connectDatabase } from './database/connection.ts';
import { migrateDatabase } from './database/migrate.ts';
import { visitorContext, type ContextParts } from './http/context.ts';
import { servePages, servePagesLive } from './http/serve-pages.ts';
import { acceptUpgrades } from './http/upgrades.ts';
import { openSockets } from './open-sockets.ts';
import { runJobs } from './jobs/run-jobs.ts';
import { sendWaiting } from './mail/send-mail.ts';
import type { Settings } from './settings.ts';
import { localFolderStorage } from './storage/local-folder.ts';

// A gigabyte over a slow line; what comes in is streamed away, so a slow sender holds little.
const longestRequestMs = 2 * 60 * 60 * 1000;

export type StartOptions = {
  clock?: () => Date;
  /** Leaves the pages out, where only the routes are asked. */
  withoutPages?: boolean;
  /** Where the built pages stand, when not beside the server. */
  pagesFolder?: string;
};

export type RunningServer = { address: string; parts: ContextParts; stop(): Promise<void> };

/** Starts everything the server is: database brought up to date, jobs, sockets, routes and pages. */
export async function startServer(settings: Settings, options: StartOptions = {}): Promise<RunningServer> {
  const log = pino({ level: settings.logLevel });
  const database = connectDatabase(settings.databaseUrl, 20);
  await migrateDatabase(database);
  const storage = await localFolderStorage(settings.uploadsFolder);
  const { largestFileBytes, largestImagePx, zone } = settings;
  const parts: ContextParts = {
    database,
    storage,
    limits: { largestFileBytes, largestImagePx },
    zone,
    clock: options.clock,
  };
  const { app, sessions } = makeApp(parts, settings, log);
  const server = createServer({ requestTimeout: longestRequestMs }, app);
  const closePages = options.withoutPages ? undefined : await putPagesOn(app, server, settings, options.pagesFolder);
  app.use(answerProblem);
  const sockets = await openSockets(parts, settings, log);
  const upgrades = acceptUpgrades(server, sessions, sockets.handlers);
  await new Promise<void>((done, fail) => {
    server.once('error', fail);
    server.listen(settings.port, settings.host, done);
  });
  const address = settings.address ?? addressOf(server.address(), settings.host);
  const jobs = await runJobs(database, visitorContext(parts), allTasks({ ...settings, address }), log);
  await sendWaiting(visitorContext(parts));
  const stop = async () => {
    upgrades.stop();
    await sockets.stop();
    server.closeAllConnections();
    await new Promise((done) => server.close(done));
    if (closePages) await closePages();
    await jobs.stop();
    await database.pool.end();
  };
  return { address, parts, stop };
}

async function putPagesOn(app: Express, server: Server, settings: Settings, folder = clientFolder()) {
  if (settings.development) return servePagesLive(app, server);
  servePages(app, folder);
  return undefined;
}

function addressOf(bound: AddressInfo | string | null, host: string): string {
  // A server that listens on every interface is reached on this machine under its own name.
  const reached = host === '0.0.0.0' || host === '::' ? 'localhost' : host;
  return typeof bound === 'object' && bound ? `http://${reached}:${bound.port}` : String(bound);
}

function clientFolder(): string {
  // Bundled, this file stands in dist/server beside dist/client; from its source, two steps from dist/client.
  const beside = new URL(import.meta.url.endsWith('.ts') ? '../dist/client' : '../client', import.meta.url);
  return fileURLToPath(beside);
}
