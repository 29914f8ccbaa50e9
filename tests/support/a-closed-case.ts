import { aDraftedCase, type DraftedCase } from './a-drafted-case.ts';
import { testPassword, type Admitted, type aLaboratory } from './test-server.ts';

type People = Awaited<ReturnType<typeof aLaboratory>>;

/** The fingerprint of what stands on that person's page. */
export async function contentHashOf(person: Admitted, at: string): Promise<string> {
  return String((await person.client.get(`${at}/review`)).body.contentHash);
}

/** Signs what stands there now. */
export async function sign(person: Admitted, at: string, meaning: string, more: Record<string, unknown> = {}) {
  const contentHash = await contentHashOf(person, at);
  return person.client.post(`${at}/signatures`, { meaning, password: testPassword, contentHash, ...more });
}

/** A case sent to review by the analyst, every note of its readiness accepted, and signed by its author. */
export async function aCaseToApprove(people: People): Promise<DraftedCase> {
  const drafted = await aDraftedCase(people);
  const sent = await people.analyst.client.post(`${drafted.at}/review/send`);
  if (sent.status !== 201) throw new Error(`not sent: ${JSON.stringify(sent.body)}`);
  await acceptNotes(people.manager, drafted.at);
  const signed = await sign(people.analyst, drafted.at, 'authored');
  if (signed.status !== 201) throw new Error(`not signed: ${JSON.stringify(signed.body)}`);
  return drafted;
}

export async function acceptNotes(manager: Admitted, at: string): Promise<void> {
  const { body } = await manager.client.get(`${at}/review`);
  const notes = body.readiness.filter(
    (point: { kind: string; accepted: unknown }) => point.kind === 'note' && !point.accepted,
  );
  for (const { sentence } of notes)
    await manager.client.post(`${at}/review/notes/accept`, {
      note: sentence,
      reason: 'It does not bear on the answer.',
    });
}

/** A case closed by the manager, all at the routes. */
export async function aClosedCase(people: People): Promise<DraftedCase & { sealNumber: string }> {
  const drafted = await aCaseToApprove(people);
  const { status, body } = await sign(people.manager, drafted.at, 'approved');
  if (status !== 201) throw new Error(`not closed: ${JSON.stringify(body)}`);
  return { ...drafted, sealNumber: String(body.sealNumber) };
}
