import type { ContextParts, VisitorContext } from '../http/context.ts';
import { admitPerson, enterOrganisation } from '../features/people/service/admit-person.ts';
import { listPeople } from '../features/people/queries.ts';

export const demoPassword = 'hackle and mist';

/** Puts the demo into an empty database, by acting through the services; says which accounts there are. */
export async function seedDemo(_parts: ContextParts, context: VisitorContext): Promise<string[]> {
  const already = await listPeople(context.reader);
  if (already.length === 0) {
    const laboratory = await enterOrganisation(context, { name: 'Marrowdene Fracture Laboratory', kind: 'laboratory' });
    await admitPerson(context, {
      name: 'Ottoline Brask',
      mail: 'administrator@marrowdene.example',
      organisationId: laboratory.id,
      roles: ['administrator'],
      password: demoPassword,
    });
  }
  const people = await listPeople(context.reader);
  return [`Demo accounts, password "${demoPassword}":`, ...people.map((person) => person.mail)];
}
