import { drizzle, type NodePgDatabase, type NodePgQueryResultHKT } from 'drizzle-orm/node-postgres';
import type { PgDatabase } from 'drizzle-orm/pg-core';
import pg from 'pg';

type Rows = PgDatabase<NodePgQueryResultHKT, Record<string, never>>;

/** Where queries read: the pool, or a transaction under way. */
export type Reader = { readonly db: Rows };

/** A transaction under way, with the one instant that all it writes carries. */
export type Transaction = Reader & { readonly at: Date };

export type Database = Reader & { readonly pool: pg.Pool; readonly db: NodePgDatabase };

/** Opens a pool of at most `connections` connections to the PostgreSQL at `url`. */
export function connectDatabase(url: string, connections = 10): Database {
  const pool = new pg.Pool({ connectionString: url, max: connections });
  // A connection lost while idle is replaced at the next query; without a listener it would end the process.
  pool.on('error', () => undefined);
  pool.on('connect', (client) => client.on('error', () => undefined));
  return { pool, db: drizzle(pool, { casing: 'snake_case' }) };
}
