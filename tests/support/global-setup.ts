import { relative, sep } from 'node:path';
import type { TestProject } from 'vitest/node';
import { startTestCluster } from '../../server/bin/test-cluster.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of a PostgreSQL server made for this run; empty when none of the chosen tests uses one. */
    pgUrl: string;
  }
}

// These rooms of tests reckon, draw and read sources, and never ask the database.
const WITHOUT_DATABASE = ['shared', 'server', 'src', 'tests/reference'];

function usesDatabase(root: string, file: string): boolean {
  const path = relative(root, file).split(sep).join('/');
  return !WITHOUT_DATABASE.some((room) => path.startsWith(`${room}/`));
}

/** Gives the tests a PostgreSQL server: the one already made for the run, or one of its own, only when needed. */
export default async function setup(project: TestProject): Promise<(() => Promise<void>) | undefined> {
  const given = process.env.HACKLEBOOK_TEST_PG;
  if (given) {
    project.provide('pgUrl', given);
    return undefined;
  }
  const watches = project.vitest.config.watch;
  const files = project.vitest.state.getPaths();
  if (!watches && !files.some((file) => usesDatabase(project.config.root, file))) {
    project.provide('pgUrl', '');
    return undefined;
  }
  const cluster = await startTestCluster();
  project.provide('pgUrl', cluster.url);
  return cluster.stop;
}
