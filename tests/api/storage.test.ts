import { createHash } from 'node:crypto';
import { mkdir, mkdtemp, readdir, readFile, rm, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { localFolderStorage } from '#server/storage/local-folder.ts';
import type { Storage } from '#server/storage/storage.ts';

let folder: string;
let storage: Storage;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'hacklebook-storage-'));
  storage = await localFolderStorage(folder);
});
afterAll(() => rm(folder, { recursive: true, force: true }));

const streamOf = (...parts: string[]) => Readable.from(parts.map((part) => Buffer.from(part)));
const hashOf = (text: string) => createHash('sha256').update(text).digest('hex');

describe('an original', () => {
  it('is kept under the SHA-256 of its bytes and comes back unchanged', async () => {
    const kept = await storage.keepOriginal(streamOf('a face ', 'of a bar'));
    expect(kept).toEqual({ sha256: hashOf('a face of a bar'), bytes: 15 });
    const back = await (await storage.readOriginal(kept.sha256)).toArray();
    expect(Buffer.concat(back).toString()).toBe('a face of a bar');
  });

  it('leaves nothing where its stream breaks off', async () => {
    const breaking = Readable.from(
      (async function* () {
        yield Buffer.from('half of ');
        throw new Error('the line fell away');
      })(),
    );
    await expect(storage.keepOriginal(breaking)).rejects.toThrow('fell away');
    expect(await readdir(join(folder, 'arriving'))).toEqual([]);
  });

  it('goes with all that was derived from it', async () => {
    const { sha256 } = await storage.keepOriginal(streamOf('to be dropped'));
    await storage.keepDerived(sha256, 'tiles/0/0_0.jpeg', Buffer.from('tile'));
    await storage.dropOriginal(sha256);
    await expect(storage.readOriginal(sha256)).rejects.toThrow();
    expect(await storage.readDerived(sha256, 'tiles/0/0_0.jpeg')).toBeNull();
  });

  it('is never asked for by a path', async () => {
    await expect(storage.readOriginal('../../etc/passwd')).rejects.toThrow('not a SHA-256');
    await expect(async () => storage.readDerived('0'.repeat(64), '../originals/x')).rejects.toThrow('not the name');
  });
});

describe('what is derived from an original', () => {
  it('is taken from a work folder in place of what was there', async () => {
    const { sha256 } = await storage.keepOriginal(streamOf('with tiles'));
    for (const content of ['first', 'second']) {
      const work = await storage.workFolder();
      await mkdir(join(work, 'tiles', '0'), { recursive: true });
      await writeFile(join(work, 'tiles', '0', '0_0.jpeg'), content);
      await storage.keepDerivedFolder(sha256, work);
      const tile = await storage.readDerived(sha256, 'tiles/0/0_0.jpeg');
      expect(Buffer.from(tile ?? []).toString()).toBe(content);
    }
    expect(await readdir(join(folder, 'working'))).toEqual([]);
  });
});

describe('what a process that was ended left half done', () => {
  it('is cleared at the next start once it is a day old, and not before', async () => {
    const [old, fresh] = [join(folder, 'arriving', 'old'), join(folder, 'arriving', 'fresh')];
    await writeFile(old, 'half');
    await writeFile(fresh, 'half');
    const twoDaysAgo = new Date(Date.now() - 2 * 24 * 3600 * 1000);
    await utimes(old, twoDaysAgo, twoDaysAgo);
    await localFolderStorage(folder);
    expect(await readdir(join(folder, 'arriving'))).toEqual(['fresh']);
    expect((await readFile(fresh)).toString()).toBe('half');
  });
});
