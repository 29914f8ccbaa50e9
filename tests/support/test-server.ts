import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { inject } from 'vitest';
import type { Person } from '#shared/contracts/people.ts';
import type { OrganisationKind, Role } from '#shared/vocabulary/roles.ts';
import { admitPerson, enterOrganisation } from '#server/features/people/service/admit-person.ts';
import { findOpenPerson } from '#server/features/people/service/find-settings.ts';
import { contextFor, visitorContext, type Context, type ContextParts } from '#server/http/context.ts';
import { readSettings } from '#server/settings.ts';
import { startServer, type StartOptions } from '#server/start-server.ts';
import { ApiClient } from './api-client.ts';
import { freshDatabase } from './database.ts';

export const testPassword = 'a long enough password';

export type TestServer = Awaited<ReturnType<typeof startTestServer>>;

/** The real server on a database of its own, with a folder for bytes that goes away with it. */
export async function startTestServer(options: StartOptions & { environment?: Record<string, string> } = {}) {
  const fresh = await freshDatabase(inject('pgUrl'));
  const uploads = await mkdtemp(join(tmpdir(), 'hacklebook-uploads-'));
  const settings = readSettings({
    DATABASE_URL: fresh.url,
    PORT: '0',
    HACKLEBOOK_UPLOADS: uploads,
    HACKLEBOOK_SECRET: 'only for tests, only for tests, only for tests',
    HACKLEBOOK_DEMO: 'no',
    LOG_LEVEL: process.env.LOG_LEVEL ?? 'error',
    ...options.environment,
  });
  const server = await startServer(settings, { withoutPages: true, ...options });
  return {
    ...server,
    databaseUrl: fresh.url,
    uploadsFolder: uploads,
    visitor: () => new ApiClient(server.address),
    stop: async () => {
      await server.stop();
      await fresh.drop();
      await rm(uploads, { recursive: true, force: true });
    },
  };
}

export type Admitted = { person: Person; context: Context; client: ApiClient; mail: string };

/** Enters an organisation; its people are then admitted with `admit`. */
export function enter(server: TestServer, name: string, kind: OrganisationKind) {
  return enterOrganisation(visitorContext(server.parts), { name, kind });
}

/** Admits a person and signs them in at the routes. */
export async function admit(
  server: TestServer,
  entry: { name: string; organisationId: string; roles: readonly Role[] },
): Promise<Admitted> {
  const mail = `${entry.name.toLowerCase().replaceAll(' ', '.')}@test.example`;
  const { id } = await admitPerson(visitorContext(server.parts), { ...entry, mail, password: testPassword });
  const client = server.visitor();
  await client.signIn(mail, testPassword);
  const context = await contextOf(server.parts, id);
  return { person: context.person, context, client, mail };
}

/** The context in which a service acts for that person. */
export async function contextOf(parts: ContextParts, personId: string): Promise<Context> {
  const person = await findOpenPerson({ reader: parts.database }, personId);
  if (!person) throw new Error('no open account under that id');
  return contextFor(person, parts);
}

/** A laboratory with one person a role, a maker with its engineer and requester, and an outside firm. */
export async function aLaboratory(server: TestServer) {
  const laboratory = await enter(server, 'Test Laboratory', 'laboratory');
  const maker = await enter(server, 'Test Maker', 'maker');
  const outside = await enter(server, 'Test Outside', 'outside');
  const inLaboratory = (name: string, ...roles: Role[]) =>
    admit(server, { name, organisationId: laboratory.id, roles });
  return {
    laboratory,
    maker,
    outside,
    analyst: await inLaboratory('Ana Lyst', 'analyst'),
    secondAnalyst: await inLaboratory('Second Reader', 'analyst'),
    engineer: await inLaboratory('Lab Engineer', 'engineer'),
    manager: await inLaboratory('Lab Manager', 'manager'),
    administrator: await inLaboratory('Lab Administrator', 'administrator'),
    makerEngineer: await admit(server, { name: 'Maker Engineer', organisationId: maker.id, roles: ['engineer'] }),
    requester: await admit(server, { name: 'Maker Requester', organisationId: maker.id, roles: ['requester'] }),
    outsider: await admit(server, { name: 'Outside Requester', organisationId: outside.id, roles: ['requester'] }),
  };
}
