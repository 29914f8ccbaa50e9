import { existsSync, readdirSync, renameSync, rmSync } from 'node:fs';
import { basename, join } from 'node:path';
import { Failure } from './failure.mjs';
import { inProject } from './project.mjs';

function workerFiles(folder) {
  return readdirSync(folder, { recursive: true })
    .filter((path) => /(^|\/)[\w-]*worker[\w-]*\.ts$/.test(path) && !path.endsWith('.d.ts'))
    .map((path) => join(folder, path));
}

/** main.ts and every worker, each a file of its own in one flat folder, so that `./x.js` finds a worker. */
function entryPoints() {
  const rooms = [inProject('server', 'jobs'), inProject('server', 'imaging')];
  const paths = [inProject('server', 'main.ts'), ...rooms.filter((room) => existsSync(room)).flatMap(workerFiles)];
  return Object.fromEntries(paths.map((path) => [basename(path, '.ts'), path]));
}

const roomsOfTheProject = {
  name: 'rooms-of-the-project',
  setup(build) {
    build.onResolve({ filter: /^#(shared|server)\// }, ({ path }) => ({ path: inProject(path.slice(1)) }));
  },
};

/** Bundles the server into dist/server; npm packages stay outside the bundle. */
export async function bundleServer() {
  if (!existsSync(inProject('server', 'main.ts'))) {
    throw new Failure('server/main.ts is missing.', 'Fetch the whole project again.');
  }
  const esbuild = await import('esbuild');
  const fresh = inProject('dist', 'server.making');
  rmSync(fresh, { recursive: true, force: true });
  try {
    await esbuild.build({
      absWorkingDir: inProject(),
      entryPoints: entryPoints(),
      outdir: fresh,
      chunkNames: '[name]-[hash]',
      bundle: true,
      splitting: true,
      format: 'esm',
      packages: 'external',
      platform: 'node',
      target: 'node20',
      logLevel: 'silent',
      plugins: [roomsOfTheProject],
    });
  } catch (error) {
    const messages = (error.errors ?? []).map(({ text, location }) => `${location?.file}:${location?.line}: ${text}`);
    throw new Failure(
      `The server could not be built:\n${messages.join('\n') || error.message}`,
      'Mend the file named above, or go back to the last version that worked.',
    );
  }
  rmSync(inProject('dist', 'server'), { recursive: true, force: true });
  renameSync(fresh, inProject('dist', 'server'));
}
