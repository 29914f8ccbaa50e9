import { sql } from 'drizzle-orm';
import { inviteAsFirst } from '../features/people/service/invite-first.ts';
import type { VisitorContext } from '../http/context.ts';

type FirstSettings = { firstAdministrator?: string; laboratoryName: string; address: string };

/**
 * Where nobody can administer yet, invites the first administrator whom the environment names, and says the link to be
 * opened. At a later start, while the invitation has not been accepted, it makes a new link.
 */
export async function inviteFirstAdministrator(context: VisitorContext, settings: FirstSettings): Promise<string[]> {
  return context.inTransaction(async (tx) => {
    // Two processes that start at once must not both invite.
    await tx.db.execute(sql`select pg_advisory_xact_lock(hashtextextended('first administrator', 0))`);
    const named = settings.firstAdministrator && readNamed(settings.firstAdministrator);
    const link = await inviteAsFirst(tx, named || null, settings.laboratoryName);
    if (link === 'not needed') return [];
    if (link === 'nobody named')
      return [
        'Nobody can sign in yet. Stop the program, set HACKLEBOOK_FIRST_ADMINISTRATOR="Name <mail>" and',
        'HACKLEBOOK_LABORATORY="name of the laboratory", and start it again.',
      ];
    return ['The first administrator opens this link within seven days; it works once:', settings.address + link];
  });
}

/** Reads "Name <mail>". */
function readNamed(words: string): { name: string; mail: string } | null {
  const read = /^\s*([^<>]+?)\s*<([^<>\s]+)>\s*$/.exec(words);
  return read ? { name: read[1], mail: read[2] } : null;
}
