import type { CaseOpened } from '#shared/contracts/cases.ts';
import type { aLaboratory } from './test-server.ts';

type People = Awaited<ReturnType<typeof aLaboratory>>;

/** What the analyst types to open a case of the maker. */
export function caseFacts(people: Pick<People, 'maker'>, more: Partial<CaseOpened> = {}): CaseOpened {
  return {
    title: 'Post, porcelain: broke at the foot',
    summary: 'Drawn in by hand.',
    kind: 'service part',
    urgency: 'routine',
    organisationId: people.maker.id,
    materialId: null,
    questions: [{ key: 'q1', text: 'Are the others safe?' }],
    ...more,
  };
}

/** A case opened by the analyst at the route. */
export async function openedCase(
  people: People,
  more: Partial<CaseOpened> = {},
): Promise<{ number: string; id: string }> {
  const { body } = await people.analyst.client.post('/cases', caseFacts(people, more));
  return body;
}

/** The manager restricts a case to the people named, and themself. */
export async function restrict(people: People, number: string, namedPersonIds: string[]): Promise<void> {
  const { version } = (await people.manager.client.get(`/cases/${number}`)).body;
  const wall = { restricted: true, namedPersonIds, versionSeen: version };
  await people.manager.client.put(`/cases/${number}/restriction`, wall);
}
