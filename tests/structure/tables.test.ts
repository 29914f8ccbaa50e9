import pg from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { openTables, recordTables, sealedTables } from '#server/database/sealed-tables.ts';
import { freshDatabase } from '../support/database.ts';

let client: pg.Client;
let drop: () => Promise<void>;

beforeAll(async () => {
  const fresh = await freshDatabase(inject('pgUrl'));
  client = new pg.Client({ connectionString: fresh.url });
  await client.connect();
  drop = fresh.drop;
});
afterAll(async () => {
  await client.end();
  await drop();
});

async function tablesWithTrigger(procedure: string): Promise<string[]> {
  const { rows } = await client.query<{ name: string }>(
    `select distinct c.relname as name from pg_trigger t join pg_class c on c.oid = t.tgrelid join pg_proc p on p.oid = t.tgfoid
     where p.proname = $1 and not t.tgisinternal and t.tgenabled = 'O' order by 1`,
    [procedure],
  );
  return rows.map((row) => row.name);
}

describe('the tables of the database', () => {
  it('each stand in exactly one of the two lists, sealed or open', async () => {
    const { rows } = await client.query<{ name: string }>(
      `select tablename as name from pg_tables where schemaname = 'public' order by 1`,
    );
    const listed = [...sealedTables, ...openTables].sort();
    expect(rows.map((row) => row.name)).toEqual(listed);
  });

  it('refuse every write under a closed case where they are listed as sealed', async () => {
    const guarded = [
      ...(await tablesWithTrigger('refuse_under_seal')),
      ...(await tablesWithTrigger('refuse_sealed_case')),
    ];
    expect(guarded.sort()).toEqual([...sealedTables].sort());
  });

  it('refuse change and removal where they are listed as records', async () => {
    expect(await tablesWithTrigger('refuse_change_of_record')).toEqual([...recordTables].sort());
  });
});
