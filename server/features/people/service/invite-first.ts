import type { Transaction } from '../../../database/connection.ts';
import { countAdministrators, findPersonByMail } from '../queries.ts';
import { listOrganisations } from '../queries/organisations.ts';
import { sendInvitation, writeInvitation } from './invitations.ts';
import { writeOrganisation } from './organisations.ts';

/** Invites the one named, unless somebody can administer already. @returns the link's path, or why there is none */
export async function inviteAsFirst(
  tx: Transaction,
  named: { name: string; mail: string } | null,
  laboratoryName: string,
): Promise<string> {
  if ((await countAdministrators(tx)) > 0) return 'not needed';
  if (!named) return 'nobody named';
  const known = await findPersonByMail(tx, named.mail);
  if (known?.state === 'invited') return sendInvitation(tx, null, known);
  const laboratory =
    (await listOrganisations(tx)).find(({ kind }) => kind === 'laboratory') ??
    (await writeOrganisation(tx, null, { name: laboratoryName, kind: 'laboratory' }));
  const invitation = { ...named, organisationId: laboratory.id, roles: ['administrator' as const] };
  return (await writeInvitation(tx, null, invitation)).link;
}
