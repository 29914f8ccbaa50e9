import { createHash, randomUUID } from 'node:crypto';
import { createReadStream, createWriteStream } from 'node:fs';
import { access, mkdir, open, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Storage } from './storage.ts';

/** Keeps bytes in a local folder: originals by their SHA-256, what is derived from them beside. */
export async function localFolderStorage(folder: string): Promise<Storage> {
  const root = resolve(folder);
  const arriving = join(root, 'arriving');
  await mkdir(arriving, { recursive: true });
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
    dropOriginal: (sha256) => rm(original(sha256), { force: true }),
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
  };
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
