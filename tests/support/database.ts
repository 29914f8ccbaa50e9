import { createHash, randomUUID } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { connectDatabase } from '#server/database/connection.ts';
import { migrateDatabase } from '#server/database/migrate.ts';

const MIGRATIONS = join(import.meta.dirname, '..', '..', 'drizzle');
// Any number will do that nothing else on the server locks.
const TEMPLATE_LOCK = 7_153_002;

export type FreshDatabase = {
  /** Address of a database of this test's own, with all migrations and no rows of ours. */
  url: string;
  /** Removes it, also when connections are still open. */
  drop: () => Promise<void>;
};

function migrationsHash(): string {
  const hash = createHash('sha256');
  for (const name of readdirSync(MIGRATIONS).sort()) {
    if (name.endsWith('.sql')) hash.update(name).update(readFileSync(join(MIGRATIONS, name)));
  }
  return hash.digest('hex').slice(0, 16);
}

function addressOf(pgUrl: string, database: string): string {
  const address = new URL(pgUrl);
  address.pathname = `/${database}`;
  return address.href;
}

async function withClient<T>(pgUrl: string, act: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: pgUrl });
  await client.connect();
  try {
    return await act(client);
  } finally {
    await client.end();
  }
}

async function migrateInto(url: string): Promise<void> {
  const database = connectDatabase(url, 2);
  try {
    await migrateDatabase(database);
  } finally {
    await database.pool.end();
  }
}

/** Makes the migrated database that the others are copied from, unless it is there; other test files wait meanwhile. */
async function ensureTemplate(pgUrl: string, client: pg.Client): Promise<string> {
  const template = `template_${migrationsHash()}`;
  await client.query('select pg_advisory_lock($1)', [TEMPLATE_LOCK]);
  try {
    const found = await client.query('select 1 from pg_database where datname = $1', [template]);
    if (found.rowCount === 0) {
      const making = `${template}_making`;
      await client.query(`drop database if exists ${making} with (force)`);
      await client.query(`create database ${making}`);
      await migrateInto(addressOf(pgUrl, making));
      await client.query(`alter database ${making} rename to ${template}`);
    }
  } finally {
    await client.query('select pg_advisory_unlock($1)', [TEMPLATE_LOCK]);
  }
  return template;
}

/**
 * Makes a database for one test file, as a copy of a template migrated once for the server.
 * @param pgUrl the server's address, from `inject('pgUrl')`
 */
export async function freshDatabase(pgUrl: string): Promise<FreshDatabase> {
  if (pgUrl === '')
    throw new Error('No PostgreSQL was started: tests that use one belong to tests/, not beside a file');
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  await withClient(pgUrl, async (client) => {
    const template = await ensureTemplate(pgUrl, client);
    await client.query(`create database ${name} template ${template}`);
  });
  return {
    url: addressOf(pgUrl, name),
    drop: () =>
      withClient(pgUrl, async (client) => {
        await client.query(`drop database if exists ${name} with (force)`);
      }),
  };
}
