import { setTimeout as wait } from 'node:timers/promises';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { loadFindings } from '#server/collaboration/findings-rows.ts';
import { findingsOutline } from '#shared/contracts/findings.ts';
import { openedCase } from '#tests/support/cases-at-hand.ts';
import { closeByHand } from '#tests/support/close-by-hand.ts';
import { FindingsWriter } from '#tests/support/findings-writer.ts';
import { eventually } from '#tests/support/mailbox.ts';
import { startServerProcess } from '#tests/support/server-process.ts';
import { aLaboratory, startTestServer, type Admitted, type TestServer } from '#tests/support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;
let open: FindingsWriter[] = [];

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterEach(() => {
  for (const writer of open) writer.leave();
  open = [];
});
afterAll(() => server.stop());

function writer(person: Admitted, number: string, address = server.address): FindingsWriter {
  const made = new FindingsWriter(address, person.client.cookie, number);
  open.push(made);
  return made;
}

async function opened(person: Admitted, number: string, address = server.address): Promise<FindingsWriter> {
  const made = writer(person, number, address);
  await made.open();
  return made;
}

const reader = () => ({ db: server.parts.database.db });

async function inDatabase(caseId: string): Promise<string> {
  const { text } = await loadFindings(reader(), caseId);
  return text.getXmlFragment('default').toString();
}

const entriesOf = async (caseId: string) =>
  (
    await server.parts.database.pool.query<{ person_name: string }>(
      `select person_name from audit_entries where case_id = $1 and act = 'findings.written' order by id`,
      [caseId],
    )
  ).rows.map((row) => row.person_name);

describe('findings written together', () => {
  it('keep what two people write at the same time, once each, in the database and on both pages', async () => {
    const { number, id } = await openedCase(people);
    const [one, two] = await Promise.all([opened(people.analyst, number), opened(people.engineer, number)]);
    for (let line = 0; line < 20; line += 1) {
      one.write(`Ana says ${line}.`);
      two.write(`Lab Engineer says ${line}.`);
      if (line % 5 === 0) await wait(5);
    }
    await Promise.all([one.kept(), two.kept()]);
    await one.reads('Lab Engineer says 19.');
    await two.reads('Ana says 19.');
    expect(two.words).toBe(one.words);
    expect(await inDatabase(id)).toBe(one.words);
    expect(one.words.match(/Ana says 7\./g)).toHaveLength(1);
    expect(await entriesOf(id)).toHaveLength(2);
  });

  it('begin with the outline, once, when two open them at the same moment', async () => {
    const { number, id } = await openedCase(people);
    const all = [people.analyst, people.secondAnalyst, people.engineer, people.manager];
    await Promise.all(all.map((person) => opened(person, number)));
    const [text] = open;
    await text.reads('What to do');
    for (const part of findingsOutline) expect(text.words.split(`>${part}<`)).toHaveLength(2);
    expect(await inDatabase(id)).toBe(text.words);
  });

  it('say that they are kept only once they are in the database', async () => {
    const { number, id } = await openedCase(people);
    const one = await opened(people.analyst, number);
    await one.kept();
    const client = await server.parts.database.pool.connect();
    await client.query('begin');
    await client.query('select 1 from cases where id = $1 for update', [id]);
    one.write('While the case is locked.');
    await wait(300);
    expect(one.isKept).toBe(false);
    expect(await inDatabase(id)).not.toContain('While the case is locked.');
    await client.query('commit');
    client.release();
    await one.kept();
    expect(await inDatabase(id)).toContain('While the case is locked.');
  });

  it('know a line that was struck out as not kept until the striking out is', async () => {
    const { number, id } = await openedCase(people);
    const one = await opened(people.analyst, number);
    one.write('Struck out later.');
    await one.kept();
    one.fragment.delete(one.fragment.length - 1, 1);
    expect(one.isKept).toBe(false);
    await one.kept();
    expect(await inDatabase(id)).not.toContain('Struck out later.');
  });

  it('are read but not written by the manager', async () => {
    const { number, id } = await openedCase(people);
    const ana = await opened(people.analyst, number);
    const manager = await opened(people.manager, number);
    expect([ana.scope, manager.scope]).toEqual(['read-write', 'readonly']);
    manager.write('By the manager.');
    ana.write('By the analyst.');
    await ana.kept();
    await manager.reads('By the analyst.');
    expect(await inDatabase(id)).not.toContain('By the manager.');
    expect(manager.isKept).toBe(false);
  });

  it('are not there for an outsider, as a case that is not there', async () => {
    const { number } = await openedCase(people);
    const outsider = writer(people.outsider, number);
    const nowhere = writer(people.analyst, 'HB-2026-9999');
    const requester = writer(people.requester, number);
    await eventually(
      async () => ([outsider, nowhere, requester].every((each) => each.closings.includes(4404)) ? true : null),
      'closed sockets',
    );
    for (const each of [outsider, nowhere, requester]) {
      expect(each.refusals[0]).toBe('nothing here');
      expect(each.closings).toContain(4404);
      expect(each.words).toBe('');
    }
  });
});

describe('findings of a case that is taken out of the hands of its writers', () => {
  it('become read-only at once when the case is put on hold, and are written on when it is taken up again', async () => {
    const { number, id } = await openedCase(people);
    const one = await opened(people.analyst, number);
    one.write('Before the hold.');
    await one.kept();
    const { version } = (await people.analyst.client.get(`/cases/${number}`)).body;
    const held = await people.analyst.client.put(`/cases/${number}/hold`, {
      reason: 'The second half is awaited.',
      until: '2030-01-01',
      versionSeen: version,
    });
    expect(held.status).toBeLessThan(300);
    await eventually(async () => (one.scope === 'readonly' ? true : null), 'reading only');
    one.write('During the hold.');
    await wait(300);
    expect(one.isKept).toBe(false);
    expect(await inDatabase(id)).not.toContain('During the hold.');
    await people.analyst.client.delete(`/cases/${number}/hold`, { versionSeen: version + 1 });
    await eventually(async () => (one.scope === 'read-write' ? true : null), 'writing again');
    await one.kept();
    expect(await inDatabase(id)).toContain('During the hold.');
  });

  it('take no line that arrives after the closure, say so in words, and leave it on the page', async () => {
    const { number, id } = await openedCase(people);
    const one = await opened(people.analyst, number);
    one.write('Before the closure.');
    await one.kept();
    await closeByHand(server, id);
    one.write('After the closure.');
    const refusal = await eventually(
      async () => one.news.find((each) => each.kind === 'not kept') ?? null,
      'a refusal in words',
    );
    expect(refusal).toMatchObject({ again: false, words: expect.stringContaining('closed and sealed') });
    await eventually(async () => (one.scope === 'readonly' && one.provider.isSynced ? true : null), 'reading only');
    expect(one.words).toContain('After the closure.');
    expect(one.isKept).toBe(false);
    expect(await inDatabase(id)).not.toContain('After the closure.');
    expect((await opened(people.secondAnalyst, number)).words).not.toContain('After the closure.');
  });
});

describe('findings while the database fails', () => {
  it('are not said to be kept, and are kept once it answers again', async () => {
    const { number, id } = await openedCase(people);
    const [one, two] = [await opened(people.analyst, number), await opened(people.engineer, number)];
    await server.parts.database.pool.query(
      `create function fail_findings() returns trigger language plpgsql as $$ begin raise exception 'disk full'; end $$;
       create trigger a_failure before insert on findings_updates for each row execute function fail_findings()`,
    );
    one.write('Typed while the disk was full.');
    await eventually(async () => one.news.find((each) => each.kind === 'not kept') ?? null, 'not kept');
    two.write('Typed by the other as well.');
    await wait(200);
    expect([one.isKept, two.isKept]).toEqual([false, false]);
    await server.parts.database.pool.query('drop trigger a_failure on findings_updates');
    await Promise.all([one.kept(), two.kept()]);
    const words = await inDatabase(id);
    expect(words).toContain('Typed while the disk was full.');
    expect(words).toContain('Typed by the other as well.');
    await eventually(async () => (one.words === words && two.words === words ? true : null), 'one text for all');
  });
});

describe('findings on more than one server process', () => {
  it('lose nothing that was said to be kept when the server is killed, and take up what was typed meanwhile', async () => {
    const { number, id } = await openedCase(people);
    const environment = { DATABASE_URL: server.databaseUrl };
    const first = await startServerProcess(environment);
    const { port } = new URL(first.address);
    const one = await opened(people.analyst, number, first.address);
    const two = await opened(people.engineer, number, first.address);
    let keptWords = '';
    for (let line = 0; line < 60; line += 1) {
      one.write(`One ${line}.`);
      two.write(`Two ${line}.`);
      if (line === 30) {
        await Promise.all([one.kept(), two.kept()]);
        keptWords = one.words;
      }
      await wait(4);
      if (line === 50) void first.kill();
    }
    await first.kill();
    const found = await inDatabase(id);
    for (const said of keptWords.match(/(One|Two) \d+\./g) ?? []) expect(found).toContain(said);
    expect(keptWords).toContain('One ');
    one.write('One while it was down.');
    expect(one.isKept).toBe(false);
    const second = await startServerProcess({ ...environment, PORT: port });
    await Promise.all([one.kept(), two.kept()]);
    const words = await inDatabase(id);
    for (let line = 0; line < 60; line += 1) {
      expect(words.split(`>One ${line}.<`)).toHaveLength(2);
      expect(words.split(`>Two ${line}.<`)).toHaveLength(2);
    }
    expect(words).toContain('One while it was down.');
    one.write('The last line.');
    await eventually(async () => (two.words.includes('The last line.') ? true : null), 'the last line');
    await second.stop();
    expect(await inDatabase(id)).toContain('The last line.');
  });

  it('are open in one process at a time; another says to try again, and has them when the first is done', async () => {
    const { number } = await openedCase(people);
    const here = await opened(people.analyst, number);
    const other = await startServerProcess({ DATABASE_URL: server.databaseUrl });
    const there = writer(people.engineer, number, other.address);
    await eventually(async () => (there.closings.includes(1013) ? true : null), 'try again');
    expect(there.words).toBe('');
    here.leave();
    await there.open();
    await there.reads('What to do');
    await other.stop();
  });
});
