import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { build } from 'vite';
import { z } from 'zod';

export const name = 'script before a page shows';

const Manifest = z.record(
  z.string(),
  z.object({ file: z.string(), imports: z.array(z.string()).default([]), isEntry: z.boolean().default(false) }),
);
type Manifest = z.output<typeof Manifest>;

/** Bytes of script a browser fetches before the first page, before the bench and before the editor of the findings. */
export async function run(): Promise<string[]> {
  const folder = await mkdtemp(join(tmpdir(), 'hacklebook-bytes-'));
  try {
    await build({
      mode: 'production',
      logLevel: 'error',
      build: { outDir: folder, emptyOutDir: true, manifest: true },
    });
    const manifest = Manifest.parse(JSON.parse(await readFile(join(folder, '.vite/manifest.json'), 'utf8')));
    const entry = Object.keys(manifest).find((key) => manifest[key].isEntry) ?? '';
    const first = filesOf(manifest, [entry, 'src/pages/sign-in.tsx']);
    const casebook = filesOf(manifest, [entry, 'src/pages/casebook.tsx']);
    const bench = filesOf(manifest, [entry, 'src/pages/case/bench.tsx']);
    const findings = filesOf(manifest, [entry, 'src/pages/case/case-leaf.tsx', 'src/pages/case/findings.tsx']);
    const line = async (words: string, files: ReadonlySet<string>) => {
      const { plain, packed } = await bytesOf(folder, files);
      return `${words}: ${kilobytes(plain)} (${kilobytes(packed)} gzipped) in ${files.size} files`;
    };
    return [
      await line('before the sign-in', first),
      await line('before the Casebook', casebook),
      await line('before the bench', bench),
      await line('before the findings', findings),
    ];
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Everything fetched for these modules, without what is fetched later. */
function filesOf(manifest: Manifest, keys: readonly string[]): Set<string> {
  const seen = new Set<string>();
  const visit = (key: string) => {
    const chunk = manifest[key];
    if (!chunk) throw new Error(`the build has no chunk for ${key}`);
    if (seen.has(chunk.file)) return;
    seen.add(chunk.file);
    chunk.imports.forEach(visit);
  };
  keys.forEach(visit);
  return seen;
}

async function bytesOf(folder: string, files: ReadonlySet<string>): Promise<{ plain: number; packed: number }> {
  let [plain, packed] = [0, 0];
  for (const file of files) {
    const bytes = await readFile(join(folder, file));
    plain += bytes.length;
    packed += gzipSync(bytes).length;
  }
  return { plain, packed };
}

const kilobytes = (bytes: number) => `${(bytes / 1000).toFixed(0)} kB`;
