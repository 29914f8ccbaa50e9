import { execFile } from 'node:child_process';
import { existsSync } from 'node:fs';
import { mkdtemp, readFile, readdir, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { promisify } from 'node:util';
import { openAsBlob } from 'node:fs';
import { connectDatabase } from '#server/database/connection.ts';
import { openNewCase } from '#server/features/cases/service/open-a-case.ts';
import { admitPerson, enterOrganisation } from '#server/features/people/service/admit-person.ts';
import { findOpenPerson } from '#server/features/people/service/find-settings.ts';
import { contextFor, visitorContext, type ContextParts } from '#server/http/context.ts';
import { writeLargeGreyTiff } from '#server/imaging/synthetic-surface/large-grey-tiff.ts';
import { localFolderStorage } from '#server/storage/local-folder.ts';
import { pyramidOf } from '#shared/numeric/imaging/pyramid.ts';
import { ApiClient } from '../support/api-client.ts';
import { freshDatabase } from '../support/database.ts';
import { startServerProcess, type ServerProcess } from '../support/server-process.ts';

export const name = 'A 100-megapixel grey TIFF, from upload to its complete pyramid';

const widthPx = 10_000;
const heightPx = 10_000;
const password = 'a long enough password';
const mail = 'bench@test.example';
const vips = '/usr/bin/vips';

/** Times the real server in a process of its own, beside `vips dzsave` on the same file where that is installed. */
export async function run({ pgUrl }: { pgUrl: string }): Promise<string[]> {
  const folder = await mkdtemp(join(tmpdir(), 'hacklebook-bench-'));
  const fresh = await freshDatabase(pgUrl);
  try {
    const file = join(folder, 'large.tif');
    await writeLargeGreyTiff({ widthPx, heightPx, seed: 7 }, file);
    const environment = { DATABASE_URL: fresh.url, HACKLEBOOK_UPLOADS: join(folder, 'uploads') };
    const number = await prepareCase(environment);
    const server = await startServerProcess(environment);
    const measured = await measure(server, number, file).finally(() => server.stop());
    const tiles = await countTiles(join(folder, 'uploads'));
    const expected = pyramidOf({ widthPx, heightPx }).levels.reduce((sum, each) => sum + each.columns * each.rows, 0);
    if (tiles !== expected) throw new Error(`${tiles} tiles were cut, ${expected} belong to the pyramid`);
    const megabytes = Math.round((await stat(file)).size / 1e6);
    return [
      `${megabytes} MB brought in after ${seconds(measured.receivedMs)} s, ${tiles} tiles ready after ${seconds(measured.readyMs)} s`,
      `largest memory of the server's process: ${measured.peakMb} MB (VmHWM; at rest before: ${measured.restMb} MB)`,
      await besideVips(file, folder, measured.readyMs),
    ];
  } finally {
    await fresh.drop();
    await rm(folder, { recursive: true, force: true });
  }
}

async function prepareCase(environment: { DATABASE_URL: string; HACKLEBOOK_UPLOADS: string }): Promise<string> {
  const database = connectDatabase(environment.DATABASE_URL, 2);
  const storage = await localFolderStorage(environment.HACKLEBOOK_UPLOADS);
  const limits = { largestFileBytes: 1e9, largestImagePx: 5e8 };
  const parts: ContextParts = { database, storage, limits, zone: 'Europe/London' };
  const laboratory = await enterOrganisation(visitorContext(parts), { name: 'Bench', kind: 'laboratory' });
  const admitted = { name: 'Bench', mail, organisationId: laboratory.id, roles: ['analyst'] as const, password };
  const { id } = await admitPerson(visitorContext(parts), admitted);
  const person = await findOpenPerson({ reader: database }, id);
  if (!person) throw new Error('nobody to bring the image in');
  const asked = { title: 'Bar', summary: '', kind: 'test specimen', urgency: 'routine', materialId: null } as const;
  const opened = { ...asked, organisationId: laboratory.id, questions: [] };
  const { number } = await openNewCase(contextFor(person, parts), opened);
  await database.pool.end();
  return number;
}

async function measure(server: ServerProcess, number: string, file: string) {
  const client = new ApiClient(server.address);
  await client.signIn(mail, password);
  const restMb = await peakMemoryMb(server.pid);
  const path = `/cases/${number}/fractographs`;
  const form = new FormData();
  form.set('file', await openAsBlob(file), 'large.tif');
  const begun = performance.now();
  const answer = await fetch(`${server.address}/api${path}`, { method: 'POST', headers: client.headers(), body: form });
  const receivedMs = performance.now() - begun;
  if (answer.status !== 202) throw new Error(`not brought in: ${await answer.text()}`);
  const { id } = (await answer.json()) as { id: string }; // brand: what the route answers
  for (;;) {
    const { body } = await client.get(`${path}/${id}`);
    if (body.state === 'refused') throw new Error(body.refusedReason);
    if (body.state === 'ready') break;
    await wait(50);
  }
  return { receivedMs, readyMs: performance.now() - begun, peakMb: await peakMemoryMb(server.pid), restMb };
}

/** The most memory the process ever held; its decoding threads are within it. */
async function peakMemoryMb(pid: number): Promise<number> {
  const status = await readFile(`/proc/${pid}/status`, 'utf8');
  return Math.round(Number(/VmHWM:\s+(\d+) kB/.exec(status)?.[1]) / 1000);
}

async function countTiles(uploads: string): Promise<number> {
  const names = await readdir(join(uploads, 'derived'), { recursive: true });
  return names.filter((each) => /tiles\/\d+\/\d+_\d+\.jpeg$/.test(each)).length;
}

async function besideVips(file: string, folder: string, readyMs: number): Promise<string> {
  if (!existsSync(vips)) return 'vips is absent: nothing to compare with';
  const begun = performance.now();
  const cut = [
    'dzsave',
    file,
    join(folder, 'beside'),
    '--overlap',
    '0',
    '--tile-size',
    '256',
    '--suffix',
    '.jpg[Q=88]',
  ];
  await promisify(execFile)(vips, cut);
  const vipsMs = performance.now() - begun;
  return `vips dzsave on the same file: ${seconds(vipsMs)} s; upload to pyramid takes ${(readyMs / vipsMs).toFixed(2)} times that`;
}

function seconds(ms: number): string {
  return (ms / 1000).toFixed(1);
}
