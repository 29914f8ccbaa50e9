import { request } from 'node:http';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connectDatabase } from '#server/database/connection.ts';
import { visitorContext } from '#server/http/context.ts';
import type { Post } from '#server/mail/post.ts';
import { sendMail, sendWaiting } from '#server/mail/send-mail.ts';
import { writeMail } from '#server/mail/write-mail.ts';
import { eventually, mailsTo, tokenSentTo } from '../support/mailbox.ts';
import { startSmtp } from '../support/smtp.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

const letter = {
  subject: 'HB-2026-0001, sent back',
  body: 'HB-2026-0001 is drafting again.',
  link: '/cases/HB-2026-0001',
};

const rowOf = async (server: TestServer, id: string) =>
  (await server.parts.database.pool.query('select * from outgoing_mails where id = $1', [id])).rows[0];
const settled = (server: TestServer, id: string, state: string) =>
  eventually(async () => {
    const row = await rowOf(server, id);
    return row.state === state ? row : null;
  }, `the mail to be ${state}`);
const write = (server: TestServer, to: string) =>
  visitorContext(server.parts).inTransaction((tx) => writeMail(tx, { to, ...letter }));

/** Writes a mail whose sending the server's own runner does not touch. */
async function writeUnsent(server: TestServer, to: string): Promise<string> {
  return visitorContext(server.parts).inTransaction(async (tx) => {
    const { id } = await writeMail(tx, { to, ...letter });
    await tx.db.execute(`select graphile_worker.remove_job('send-mail:${id}')`);
    return id;
  });
}

describe('a mail where no mail server is configured', () => {
  let server: TestServer;
  beforeAll(async () => {
    server = await startTestServer();
  });
  afterAll(() => server.stop());

  it('is held on this machine with its whole link, once, and the outbox forgets the link', async () => {
    const { id } = await write(server, 'reader@test.example');
    const row = await settled(server, id, 'gone');
    expect(row).toMatchObject({ link: null, tries: 1, fault: null });
    expect(await mailsTo(server, 'reader@test.example')).toEqual([
      `HB-2026-0001 is drafting again.\n\n${server.address}/cases/HB-2026-0001\n`,
    ]);
  });

  it('is not written when its act is not done after all', async () => {
    const act = visitorContext(server.parts).inTransaction(async (tx) => {
      await writeMail(tx, { to: 'nobody@test.example', ...letter });
      throw new Error('the act fails');
    });
    await expect(act).rejects.toThrow('the act fails');
    const { rows } = await server.parts.database.pool.query(
      "select 1 from outgoing_mails where to_mail like 'nobody%'",
    );
    expect(rows).toHaveLength(0);
  });

  it('goes once though its job runs twice', async () => {
    const id = await writeUnsent(server, 'twice@test.example');
    const sent: string[] = [];
    const post: Post = async (_tx, mail) => void sent.push(mail.toMail);
    await sendMail(visitorContext(server.parts), post, id);
    await sendMail(visitorContext(server.parts), post, id);
    expect(sent).toEqual(['twice@test.example']);
  });

  it('goes once though two runners take it at the same moment', async () => {
    const id = await writeUnsent(server, 'raced@test.example');
    const sent: string[] = [];
    const post: Post = async (_tx, mail) => {
      sent.push(mail.toMail);
      await new Promise((done) => setTimeout(done, 200));
    };
    const runs = await Promise.allSettled([
      sendMail(visitorContext(server.parts), post, id),
      sendMail(visitorContext(server.parts), post, id),
    ]);
    expect(sent).toEqual(['raced@test.example']);
    expect(runs.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect((await rowOf(server, id)).state).toBe('gone');
  });

  it('is neither lost nor doubled when its process ends in the middle of sending', async () => {
    const id = await writeUnsent(server, 'ended@test.example');
    const dying = connectDatabase(server.databaseUrl, 1);
    let reached = false;
    const never: Post = () => new Promise(() => (reached = true));
    const { rows } = await dying.pool.query<{ pid: number }>('select pg_backend_pid() as pid');
    void sendMail(visitorContext({ ...server.parts, database: dying }), never, id).catch(() => undefined);
    await expect.poll(() => reached).toBe(true);
    await server.parts.database.pool.query('select pg_terminate_backend($1)', [rows[0]?.pid]);
    await eventually(async () => ((await rowOf(server, id)).state === 'waiting' ? true : null), 'the row');
    await sendWaiting(visitorContext(server.parts));
    await settled(server, id, 'gone');
    expect(await mailsTo(server, 'ended@test.example')).toHaveLength(1);
  });

  it('names the server’s own address, whatever host the request spoke of', async () => {
    const people = await aLaboratory(server);
    const { mail } = people.analyst;
    const client = server.visitor();
    const { body } = await client.session();
    await new Promise<void>((done, fail) => {
      const asked = request(
        `${server.address}/api/password-links`,
        {
          method: 'POST',
          headers: {
            host: 'elsewhere.example',
            cookie: client.cookie,
            'content-type': 'application/json',
            'x-request-token': body.requestToken,
          },
        },
        (response) => {
          response.resume();
          response.on('end', done);
          expect(response.statusCode).toBe(204);
        },
      );
      asked.on('error', fail);
      asked.end(JSON.stringify({ mail }));
    });
    await tokenSentTo(server, mail);
    const [text] = await mailsTo(server, mail);
    expect(text).toContain(`${server.address}/password/`);
    expect(text).not.toContain('elsewhere');
  });
});

describe('a mail that does not go', () => {
  let server: TestServer;
  beforeAll(async () => {
    server = await startTestServer();
  });
  afterAll(() => server.stop());
  const failing =
    (responseCode?: number): Post =>
    async () => {
      throw Object.assign(new Error('the server is away'), { responseCode });
    };

  it('is tried again four times with its fault noted, then came back and keeps its link', async () => {
    const id = await writeUnsent(server, 'away@test.example');
    for (let tries = 1; tries <= 4; tries += 1) {
      await expect(sendMail(visitorContext(server.parts), failing(), id)).rejects.toThrow('tried again');
      expect(await rowOf(server, id)).toMatchObject({ state: 'waiting', tries, fault: 'the server is away' });
    }
    await sendMail(visitorContext(server.parts), failing(), id);
    expect(await rowOf(server, id)).toMatchObject({ state: 'came back', tries: 5, link: letter.link });
  });

  it('came back at once when the mail server’s no is final', async () => {
    const id = await writeUnsent(server, 'nobox@test.example');
    await sendMail(visitorContext(server.parts), failing(550), id);
    expect(await rowOf(server, id)).toMatchObject({ state: 'came back', tries: 1 });
  });
});

describe('a mail over a mail server', () => {
  it('arrives once, plain, with its link, and is tried again by its job after a passing no', async () => {
    const smtp = await startSmtp((to, attempt) => (to.startsWith('slow') && attempt === 1 ? 451 : null));
    const server = await startTestServer({ environment: { SMTP_URL: smtp.url } });
    try {
      const { id } = await write(server, 'slow@test.example');
      await settled(server, id, 'gone');
      expect(smtp.received).toHaveLength(1);
      const [mail] = smtp.received;
      expect(mail?.to).toEqual(['slow@test.example']);
      expect(mail?.text).toContain(`Message-ID: <${id}@laboratory.example>`);
      expect(mail?.text).toContain(`${server.address}/cases/HB-2026-0001`);
      expect(await rowOf(server, id)).toMatchObject({ tries: 2, link: null });
      const { rows } = await server.parts.database.pool.query('select 1 from held_mails');
      expect(rows).toHaveLength(0);
    } finally {
      await server.stop();
      await smtp.stop();
    }
  });

  it('that has no such box shows as came back, with the server’s words, and can be sent again', async () => {
    let boxIsThere = false;
    const smtp = await startSmtp(() => (boxIsThere ? null : 550));
    const server = await startTestServer({ environment: { SMTP_URL: smtp.url } });
    try {
      const { administrator, maker } = await aLaboratory(server);
      const { client } = administrator;
      const entry = {
        name: 'Glass Store',
        mail: 'glass@maker.example',
        organisationId: maker.id,
        roles: ['requester'],
      };
      const { id } = (await client.post('/people', entry)).body;
      const came = await eventually(async () => {
        const { mails } = (await client.get('/mail')).body;
        return mails[0]?.state === 'came back' ? mails[0] : null;
      }, 'the mail to come back');
      expect(came).toMatchObject({ toMail: 'glass@maker.example', fault: expect.stringContaining('no such box') });
      const { accounts } = (await client.get('/people')).body;
      const invited = accounts.find((one: { id: string }) => one.id === id);
      expect(invited.invitation).toMatchObject({ mail: 'came back' });
      expect((await client.get('/laboratory')).body.cameBack).toBe(1);
      boxIsThere = true;
      expect((await client.post(`/mail/${came.id}/again`)).status).toBe(204);
      await settled(server, came.id, 'gone');
      expect(smtp.received).toHaveLength(1);
      expect((await client.post(`/mail/${came.id}/again`)).body.code).toBe('wrong-state');
    } finally {
      await server.stop();
      await smtp.stop();
    }
  });
});
