import { createHash, randomUUID } from 'node:crypto';
import { createReadStream, createWriteStream } from 'node:fs';
import { access, mkdir, open, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Storage } from './storage.ts';

// What a process that was ended left half done; no upload and no cut takes as long.
const leftoverMs = 24 * 60 * 60 * 1000;

/** Keeps bytes in a local folder: originals by their SHA-256, what is derived from them beside. */
export async function localFolderStorage(folder: string): Promise<Storage> {
  const root = resolve(folder);
  const arriving = join(root, 'arriving');
  const working = join(root, 'working');
  for (const passing of [arriving, working]) {
    await mkdir(passing, { recursive: true });
    await clearLeftovers(passing);
  }
  const original = (sha256: string) => join(root, 'originals', sha256.slice(0, 2), requireHash(sha256));
  const derived = (sha256: string, name: string) =>
    join(root, 'derived', sha256.slice(0, 2), requireHash(sha256), requireName(name));
  return {
    keepOriginal: async (stream) => {
      const waiting = join(arriving, randomUUID());
      const counted = await writeHashed(stream, waiting);
      const path = original(counted.sha256);
      await mkdir(dirname(path), { recursive: true });
      await rename(waiting, path);
      return counted;
    },
    readOriginal: async (sha256) => {
      await access(original(sha256));
      return createReadStream(original(sha256));
    },
    originalFile: async (sha256) => {
      await access(original(sha256));
      return original(sha256);
    },
    dropOriginal: async (sha256) => {
      await rm(original(sha256), { force: true });
      await rm(dirname(derived(sha256, 'any')), { recursive: true, force: true });
    },
    keepDerived: async (sha256, name, bytes) => {
      const path = derived(sha256, name);
      await mkdir(dirname(path), { recursive: true });
      const waiting = `${path}.${randomUUID()}`;
      await writeFile(waiting, bytes);
      await rename(waiting, path);
    },
    readDerived: (sha256, name) =>
      readFile(derived(sha256, name)).catch((error: unknown) => {
        if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
        throw error;
      }),
    workFolder: async () => {
      const folder = join(working, randomUUID());
      await mkdir(folder);
      return folder;
    },
    keepDerivedFolder: async (sha256, folder) => {
      const home = dirname(derived(sha256, 'any'));
      await mkdir(home, { recursive: true });
      for (const name of await readdir(folder)) await replaceWith(join(folder, name), join(home, requireName(name)));
      await rm(folder, { recursive: true, force: true });
    },
    dropWorkFolder: (folder) => rm(requireInside(folder, working), { recursive: true, force: true }),
  };
}

/** Puts a finished folder where an older one may stand; the older one goes only after the new one is in place. */
async function replaceWith(fresh: string, place: string): Promise<void> {
  const older = `${fresh}-older`;
  const hadOlder = await rename(place, older).then(
    () => true,
    () => false,
  );
  await rename(fresh, place);
  if (hadOlder) await rm(older, { recursive: true, force: true });
}

async function clearLeftovers(folder: string): Promise<void> {
  for (const name of await readdir(folder)) {
    const { mtimeMs } = await stat(join(folder, name)).catch(() => ({ mtimeMs: Infinity }));
    if (Date.now() - mtimeMs > leftoverMs) await rm(join(folder, name), { recursive: true, force: true });
  }
}

function requireInside(path: string, folder: string): string {
  if (dirname(path) !== folder) throw new Error('not a work folder');
  return path;
}

async function writeHashed(stream: Readable, path: string): Promise<{ sha256: string; bytes: number }> {
  const hash = createHash('sha256');
  let bytes = 0;
  const count = new Transform({
    transform(chunk: Buffer, _encoding, done) {
      hash.update(chunk);
      bytes += chunk.length;
      done(null, chunk);
    },
  });
  try {
    await pipeline(stream, count, createWriteStream(path, { flags: 'wx' }));
    const file = await open(path, 'r+');
    await file.sync();
    await file.close();
  } catch (error) {
    await rm(path, { force: true });
    throw error;
  }
  return { sha256: hash.digest('hex'), bytes };
}

function requireHash(sha256: string): string {
  if (!/^[0-9a-f]{64}$/.test(sha256)) throw new Error('not a SHA-256 in hexadecimal');
  return sha256;
}

function requireName(name: string): string {
  if (!/^[a-z0-9_-]+(\/[a-z0-9_.-]+)*$/i.test(name) || name.includes('..'))
    throw new Error('not the name of a derived file');
  return name;
}
