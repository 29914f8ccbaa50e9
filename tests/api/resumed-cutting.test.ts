import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { admitPerson, enterOrganisation } from '#server/features/people/service/admit-person.ts';
import { openNewCase } from '#server/features/cases/service/open-a-case.ts';
import { connectDatabase } from '#server/database/connection.ts';
import { visitorContext, type ContextParts } from '#server/http/context.ts';
import { localFolderStorage } from '#server/storage/local-folder.ts';
import { ApiClient } from '../support/api-client.ts';
import { anImage } from '../support/an-image.ts';
import { freshDatabase, type FreshDatabase } from '../support/database.ts';
import { startServerProcess, type ServerProcess } from '../support/server-process.ts';
import { contextOf, testPassword } from '../support/test-server.ts';

let fresh: FreshDatabase;
let uploads: string;
let parts: ContextParts;
let server: ServerProcess | undefined;
const mail = 'ana.lyst@test.example';

beforeAll(async () => {
  fresh = await freshDatabase(inject('pgUrl'));
  uploads = await mkdtemp(join(tmpdir(), 'hacklebook-uploads-'));
  const limits = { largestFileBytes: 1e9, largestImagePx: 1e8 };
  const storage = await localFolderStorage(uploads);
  parts = { database: connectDatabase(fresh.url, 2), storage, limits, zone: 'Europe/London' };
});
afterAll(async () => {
  await server?.kill();
  await parts.database.pool.end();
  await fresh.drop();
  await rm(uploads, { recursive: true, force: true });
});

async function aCaseOfOneAnalyst(): Promise<string> {
  const laboratory = await enterOrganisation(visitorContext(parts), { name: 'Test Laboratory', kind: 'laboratory' });
  const admitted = { name: 'Ana Lyst', mail, organisationId: laboratory.id, roles: ['analyst'] as const };
  const { id } = await admitPerson(visitorContext(parts), { ...admitted, password: testPassword });
  const asked = { title: 'Bar', summary: '', kind: 'test specimen', urgency: 'routine', materialId: null } as const;
  const opened = { ...asked, organisationId: laboratory.id, questions: [] };
  return (await openNewCase(await contextOf(parts, id), opened)).number;
}

async function signedIn(address: string): Promise<ApiClient> {
  const client = new ApiClient(address);
  await client.signIn(mail, testPassword);
  return client;
}

/** Asks until the image is in one of the states. */
async function until(client: ApiClient, path: string, states: readonly string[], withinMs: number): Promise<string> {
  for (const end = Date.now() + withinMs; Date.now() < end; await wait(50)) {
    const { body } = await client.get(path);
    if (states.includes(body.state)) return body.state;
  }
  throw new Error(`not ${states.join(' or ')} within ${withinMs} ms`);
}

describe('a server ended in the middle of cutting', () => {
  it('finishes the image soon after it is started again', async () => {
    const number = await aCaseOfOneAnalyst();
    const environment = { DATABASE_URL: fresh.url, HACKLEBOOK_UPLOADS: uploads };
    server = await startServerProcess(environment);
    const before = await signedIn(server.address);
    const bytes = await anImage('jpeg', { widthPx: 7000, heightPx: 6000 });
    const { body } = await before.sendFile(`/cases/${number}/fractographs`, { name: 'large.jpg', bytes });
    const path = `/cases/${number}/fractographs/${body.id}`;
    await until(before, path, ['cutting tiles'], 20_000);
    await server.kill();

    server = await startServerProcess(environment);
    const after = await signedIn(server.address);
    expect((await after.get(path)).body.state).toBe('cutting tiles');
    expect(await until(after, path, ['ready', 'refused'], 40_000)).toBe('ready');
    expect((await after.get(`${path}/tiles/0/0_0`)).status).toBe(200);
  }, 90_000);
});
