import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from 'vite';

/** The pages built as for release, into a folder of their own that is taken away again. */
export async function builtPages(): Promise<{ folder: string; drop(): Promise<void> }> {
  const folder = await mkdtemp(join(tmpdir(), 'hacklebook-pages-'));
  const { NODE_ENV } = process.env;
  // A test run sets "test", with which React would be built as for its developers.
  process.env.NODE_ENV = 'production';
  try {
    await build({ mode: 'production', logLevel: 'error', build: { outDir: folder, emptyOutDir: true } });
  } finally {
    process.env.NODE_ENV = NODE_ENV;
  }
  return { folder, drop: () => rm(folder, { recursive: true, force: true }) };
}
