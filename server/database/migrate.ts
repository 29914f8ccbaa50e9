import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { drizzle } from 'drizzle-orm/node-postgres';
import { fileURLToPath } from 'node:url';
import { existsSync } from 'node:fs';
import { makeWorkerUtils } from 'graphile-worker';
import type { Database } from './connection.ts';

// One number for all processes of all versions, so that two starts never migrate at once.
const migrationLock = 716_204_511;

/** Brings the database to the newest form, one process at a time. */
export async function migrateDatabase(database: Database): Promise<void> {
  const client = await database.pool.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [migrationLock]);
    await migrate(drizzle(client, { casing: 'snake_case' }), { migrationsFolder: migrationsFolder() });
    const utils = await makeWorkerUtils({ pgPool: database.pool });
    await utils.migrate();
    await utils.release();
  } finally {
    await client.query('select pg_advisory_unlock($1)', [migrationLock]);
    client.release();
  }
}

function migrationsFolder(): string {
  // The same file runs from server/database and, bundled, from dist/server.
  for (const path of ['../../drizzle', '../drizzle', './drizzle']) {
    const folder = fileURLToPath(new URL(path, import.meta.url));
    if (existsSync(`${folder}/meta/_journal.json`)) return folder;
  }
  throw new Error('The folder drizzle/ with the migrations is missing beside the program.');
}
