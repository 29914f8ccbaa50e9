import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { recordAct } from '#server/audit/record-act.ts';
import { inviteFirstAdministrator } from '#server/database/first-administrator.ts';
import { visitorContext } from '#server/http/context.ts';
import { eventually, mailsTo } from '../support/mailbox.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const trail = async (query = '') => (await people.administrator.client.get(`/trail${query}`)).body;
const check = async () => (await people.administrator.client.get('/trail/check')).body;
const query = (text: string, values: unknown[] = []) => server.parts.database.pool.query(text, values);

/** Changes rows that no trigger lets anyone change, as someone with the database in hand could. */
async function asIntruder(text: string, values: unknown[]) {
  const client = await server.parts.database.pool.connect();
  try {
    await client.query("set session_replication_role = 'replica'");
    await client.query(text, values);
  } finally {
    await client.query("set session_replication_role = 'origin'");
    client.release();
  }
}

describe('the audit trail', () => {
  it('says who did what, when and to whom, before and after, newest first', async () => {
    const { client } = people.administrator;
    const { body } = await client.post('/organisations', { name: 'Cindermoor Kilns', kind: 'outside' });
    await client.patch(`/organisations/${body.id}`, { name: 'Cindermoor', version: 1 });
    const { entries } = await trail();
    expect(entries[0]).toMatchObject({
      personName: 'Lab Administrator',
      act: 'organisation.changed',
      words: 'changed an organisation',
      object: 'Cindermoor',
      caseNumber: null,
      before: { name: 'Cindermoor Kilns' },
      after: { name: 'Cindermoor' },
    });
    expect(entries[1].id).toBeLessThan(entries[0].id);
  });

  it('is read page by page without leaving an entry out or showing one twice', async () => {
    await visitorContext(server.parts).inTransaction(async (tx) => {
      for (let done = 0; done < 120; done += 1) await recordAct(tx, null, { act: 'settings.changed' });
    });
    const ids: number[] = [];
    for (let before: number | null | undefined; before !== null;) {
      const page: { entries: { id: number }[]; older: number | null } = await trail(before ? `?before=${before}` : '');
      ids.push(...page.entries.map(({ id }) => id));
      before = page.older;
    }
    const { rows } = await query('select id::int from audit_entries order by id desc');
    expect(ids).toEqual(rows.map(({ id }) => id));
  });

  it('is narrowed to a person, an act and days', async () => {
    const byAnalyst = await trail(`?personId=${people.analyst.person.id}&act=person.signed-in`);
    expect(byAnalyst.entries).toMatchObject([{ personName: 'Ana Lyst', act: 'person.signed-in' }]);
    expect((await trail('?until=2020-01-01T00:00:00Z')).entries).toEqual([]);
    expect((await trail('?from=2020-01-01T00:00:00Z')).entries.length).toBeGreaterThan(10);
  });

  it('shows an administrator nothing of a case but that something was done, and its states', async () => {
    const caseId = randomUUID();
    await visitorContext(server.parts).inTransaction((tx) =>
      recordAct(tx, null, {
        act: 'case.moved',
        inCase: { id: caseId, number: 'HB-2026-0001' },
        before: { state: 'drafting', title: 'a secret title' },
        after: { state: 'in review', title: 'a secret title' },
        reason: 'a secret reason',
      }),
    );
    const { entries } = await trail();
    expect(entries[0]).toMatchObject({ before: { state: 'drafting' }, after: { state: 'in review' }, reason: null });
    expect(JSON.stringify(entries)).not.toContain('secret');
  });
});

describe('the check of the trail', () => {
  it('recomputes every chain and finds nothing where nothing was touched', async () => {
    const { rows } = await query(
      'select count(*)::int as entries, count(distinct chain)::int as chains from audit_entries',
    );
    expect(await check()).toEqual({ ...rows[0], broken: [] });
  });

  it('names the first entry that was altered, and no later one', async () => {
    const { rows } = await query(
      "select id::int from audit_entries where chain = 'laboratory' order by id limit 1 offset 5",
    );
    const { id } = rows[0];
    const kept = (await query('select after from audit_entries where id = $1', [id])).rows[0].after;
    await expect(query('update audit_entries set after = null where id = $1', [id])).rejects.toThrow(
      'is kept as it was',
    );
    await asIntruder(`update audit_entries set after = '{"roles":["administrator"]}' where id = $1`, [id]);
    expect((await check()).broken).toMatchObject([{ entryId: id, caseNumber: null, fault: 'altered' }]);
    await asIntruder('update audit_entries set after = $2 where id = $1', [id, JSON.stringify(kept)]);
    expect((await check()).broken).toEqual([]);
  });

  it('names the entry before which one was taken out', async () => {
    const { rows } = await query(
      "select id::int from audit_entries where chain = 'laboratory' order by id limit 2 offset 8",
    );
    await asIntruder('delete from audit_entries where id = $1', [rows[0].id]);
    expect((await check()).broken).toMatchObject([{ entryId: rows[1].id, fault: 'entry missing before it' }]);
  });
});

describe('the box on this machine', () => {
  it('lists mails without their words, and the trail says who opened one', async () => {
    const { client } = people.administrator;
    await client.post('/people', {
      name: 'Box Reader',
      mail: 'box@maker.example',
      organisationId: people.maker.id,
      roles: ['requester'],
    });
    await mailsTo(server, 'box@maker.example');
    const { mails } = (await client.get('/held-mail')).body;
    expect(mails[0]).toMatchObject({ toMail: 'box@maker.example', subject: 'Invitation to Hacklebook' });
    expect(JSON.stringify(mails)).not.toContain('/invitation/');
    const opened = await client.post(`/held-mail/${mails[0].id}/opening`);
    expect(opened.body.body).toContain(`${server.address}/invitation/`);
    const [entry] = (await trail()).entries;
    expect(entry).toMatchObject({ act: 'held-mail.opened', after: { to: 'box@maker.example' } });
  });
});

describe('the first administrator of an empty book', () => {
  const named = { firstAdministrator: 'Ada Keeper <ada@laboratory.example>', laboratoryName: 'Pellmoor Laboratory' };

  it('is invited by a link that stands on the console, also when two processes start at once', async () => {
    const empty = await startTestServer();
    try {
      const context = visitorContext(empty.parts);
      const settings = { ...named, address: empty.address };
      await Promise.all([inviteFirstAdministrator(context, settings), inviteFirstAdministrator(context, settings)]);
      const [, link] = await inviteFirstAdministrator(context, settings);
      const client = empty.visitor();
      await client.session();
      const path = new URL(link ?? '').pathname.replace('/invitation/', '/invitations/');
      const accepted = await client.post(path, { password: 'mist before hackle' });
      expect(accepted.body.person).toMatchObject({
        name: 'Ada Keeper',
        organisationName: 'Pellmoor Laboratory',
        organisationKind: 'laboratory',
        roles: ['administrator'],
      });
      expect(await inviteFirstAdministrator(context, settings)).toEqual([]);
      await eventually(
        async () => ((await mailsTo(empty, 'ada@laboratory.example', 3)).length === 3 ? true : null),
        'mails',
      );
    } finally {
      await empty.stop();
    }
  });

  it('is asked for where the environment names nobody', async () => {
    const empty = await startTestServer();
    try {
      const settings = { laboratoryName: 'Pellmoor Laboratory', address: empty.address };
      const lines = await inviteFirstAdministrator(visitorContext(empty.parts), settings);
      expect(lines.join(' ')).toContain('HACKLEBOOK_FIRST_ADMINISTRATOR');
    } finally {
      await empty.stop();
    }
  });
});
