import type { TestServer } from './test-server.ts';

/** Waits until the box holds that many mails to the address; their texts, oldest first. */
export async function mailsTo(server: TestServer, mail: string, least = 1): Promise<string[]> {
  return eventually(async () => {
    const { rows } = await server.parts.database.pool.query<{ body: string }>(
      'select body from held_mails where to_mail = $1 order by id',
      [mail],
    );
    return rows.length >= least ? rows.map(({ body }) => body) : null;
  }, `${least} mails to ${mail}`);
}

/** The token of the link in the newest of that many mails to the address. */
export async function tokenSentTo(server: TestServer, mail: string, least = 1): Promise<string> {
  const text = (await mailsTo(server, mail, least)).at(-1) ?? '';
  const token = /\/(?:invitation|password)\/([\w-]{43})\s/.exec(text)?.[1];
  if (!token) throw new Error(`no link in the mail: ${text}`);
  return token;
}

/** Looks until there is something, for at most ten seconds. */
export async function eventually<Found>(look: () => Promise<Found | null>, what: string): Promise<Found> {
  for (const end = Date.now() + 10_000; Date.now() < end;) {
    const found = await look();
    if (found !== null) return found;
    await new Promise((done) => setTimeout(done, 40));
  }
  throw new Error(`waited ten seconds for ${what}`);
}
