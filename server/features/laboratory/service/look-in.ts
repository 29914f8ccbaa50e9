import type { LaboratoryView } from '#shared/contracts/laboratory.ts';
import type { Context } from '../../../http/context.ts';
import { countCameBack } from '../../../mail/queries.ts';
import { countTrail, findLaboratoryName } from '../queries.ts';

/** What the head of the place says. */
export async function lookIn({ reader, person }: Pick<Context, 'reader' | 'person'>): Promise<LaboratoryView> {
  const [name, cameBack, trailEntries] = await Promise.all([
    findLaboratoryName(reader),
    countCameBack(reader),
    countTrail(reader),
  ]);
  return { name: name ?? person.organisationName, cameBack, trailEntries };
}
