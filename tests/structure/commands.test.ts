import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterEach, beforeEach, describe, expect, inject, it } from 'vitest';
import { withLock } from '../../server/bin/lock.mjs';
import { countTests } from '../bin/count-tests.mjs';
import { freshDatabase } from '../support/database.ts';

describe('the lock between two starts', () => {
  let folder = '';
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'hacklebook-lock-'));
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  it('lets one start act after the other, never both at once', async () => {
    let acting = 0;
    let most = 0;
    const act = async () => {
      acting += 1;
      most = Math.max(most, acting);
      await new Promise((resolve) => setTimeout(resolve, 5));
      acting -= 1;
    };
    await Promise.all([1, 2, 3, 4].map(() => withLock(join(folder, 'lock'), act)));
    expect(most).toBe(1);
  });

  it('is taken from a start that was killed', async () => {
    const lock = join(folder, 'lock');
    mkdirSync(lock);
    writeFileSync(join(lock, '4194304-1'), '');
    expect(await withLock(lock, () => Promise.resolve('acted'))).toBe('acted');
  });

  it('is taken when its maker died before signing it', async () => {
    const lock = join(folder, 'lock');
    mkdirSync(lock);
    utimesSync(lock, new Date(0), new Date(0));
    expect(await withLock(lock, () => Promise.resolve('acted'))).toBe('acted');
  });

  it('gives up on a living start with a sentence that says what to do', async () => {
    const lock = join(folder, 'lock');
    const impatient = () => withLock(lock, () => Promise.resolve('acted'), { patienceMs: 150 });
    await expect(withLock(lock, impatient)).rejects.toThrow(/Stop it, or remove that folder/);
  });
});

describe('the count at the end of the tests', () => {
  const passed = { status: 'passed' };

  it('adds passed, failed and left-out tests over all files', () => {
    const files = [
      { name: 'a', status: 'passed', assertionResults: [passed, passed, { status: 'skipped' }] },
      { name: 'b', status: 'failed', assertionResults: [{ status: 'failed' }, { status: 'todo' }] },
    ];
    expect(countTests({ testResults: files }, 1)).toMatchObject({ passed: 2, failed: 1, skipped: 2 });
  });

  it('counts a file that does not load as a failure', () => {
    const files = [{ name: 'a', status: 'failed', assertionResults: [] }];
    expect(countTests({ testResults: files }, 1)).toMatchObject({ passed: 0, failed: 1 });
  });

  it('counts a run without a single test as a failure', () => {
    expect(countTests({ testResults: [] }, 0).failed).toBe(1);
    expect(countTests(undefined, 0).failed).toBe(1);
  });

  it('counts an error outside every test as a failure', () => {
    const files = [{ name: 'a', status: 'passed', assertionResults: [passed] }];
    expect(countTests({ testResults: files }, 1)).toMatchObject({ passed: 1, failed: 1 });
  });
});

describe('a database for one test file', () => {
  async function tablesOf(url: string): Promise<number> {
    const client = new pg.Client({ connectionString: url });
    await client.connect();
    const found = await client.query("select 1 from pg_tables where schemaname = 'public'");
    await client.end();
    return found.rowCount ?? 0;
  }

  it('is migrated, is its own, and goes away when dropped', async () => {
    const [one, other] = await Promise.all([freshDatabase(inject('pgUrl')), freshDatabase(inject('pgUrl'))]);
    expect(one.url).not.toBe(other.url);
    expect(await tablesOf(one.url)).toBeGreaterThan(0);
    expect(await tablesOf(other.url)).toBe(await tablesOf(one.url));
    await one.drop();
    await other.drop();
    await expect(tablesOf(one.url)).rejects.toThrow(/does not exist/);
  });
});
