import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import { estimates } from '#server/database/tables/estimates.ts';
import { recordLineage } from '#server/lineage/lineage.ts';
import { listConstantsInForce } from '#server/features/materials/service/list-constants.ts';
import { openedCase, restrict } from '../support/cases-at-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

async function aMaterial(): Promise<string> {
  const entered = { name: `alumina ${randomUUID()}`, family: 'alumina', route: null, grainSizeUm: 6, note: null };
  return (await people.engineer.client.post('/materials', entered)).body.id;
}

const toughness = {
  kind: 'toughness',
  value: '3.5 MPa m½',
  plusMinus: '0.2',
  plusMinusIs: 'U',
  source: 'own test, surface crack in flexure',
  sourceStanding: 'own test',
  condition: 'dry',
  validFrom: '2026-05-04',
  reason: null,
  replaces: null as string | null,
};

const record = (materialId: string, more = {}, who = people.engineer) =>
  who.client.post(`/materials/${materialId}/constants`, { ...toughness, ...more });

/** An estimate of a case that rests on the constant. */
function anEstimateFrom(constantId: string, caseId: string): Promise<string> {
  const { context, person } = people.analyst;
  return context.inTransaction(async (tx) => {
    const stress = { stressMPa: 300, standardUncertaintyMPa: 20, outputs: {}, budget: [], cautions: [] };
    const [{ id }] = await tx.db
      .insert(estimates)
      .values({
        ...{ caseId, number: 1, line: 'flaw', method: 'flaw', methodVersion: 1, madeBy: person.id, madeAt: tx.at },
        ...stress,
      })
      .returning({ id: estimates.id });
    await recordLineage(tx, { kind: 'estimate', id }, [{ kind: 'material constant', id: constantId }]);
    return id;
  });
}

describe('a constant of a material', () => {
  it('is kept with its interval, source and the text as typed', async () => {
    const { body } = await record(await aMaterial());
    expect(body.constant).toMatchObject({
      ...{ value: 3.5, standardUncertainty: 0.1, unit: 'MPa√m', recordNumber: 1 },
      enteredText: '3.5 MPa m½ ± 0.2 (k = 2)',
    });
  });

  it('is recorded by an engineer of the laboratory alone', async () => {
    const materialId = await aMaterial();
    for (const who of [people.analyst, people.manager, people.makerEngineer, people.requester])
      expect((await record(materialId, {}, who)).body.code).toBe('not-allowed');
  });

  it('is refused without a source, without a unit, or from a day to come', async () => {
    const materialId = await aMaterial();
    expect((await record(materialId, { source: ' ' })).body.field).toBe('source');
    expect((await record(materialId, { value: '3.5' })).body.field).toBe('value');
    expect((await record(materialId, { validFrom: '2099-01-01' })).body.field).toBe('validFrom');
  });

  it('gives way to a newer record with a reason, and both stay readable as they stood on a day', async () => {
    const materialId = await aMaterial();
    const first = (await record(materialId)).body.constant;
    const second = { value: '3.3 MPa m½', validFrom: '2026-09-01', replaces: first.id };
    expect((await record(materialId, second)).body.field).toBe('reason');
    await record(materialId, { ...second, reason: 'seven more bars' });
    const reader = server.parts.database;
    expect((await listConstantsInForce(reader, materialId)).map(({ value }) => value)).toEqual([3.3]);
    expect((await listConstantsInForce(reader, materialId, '2026-08-31')).map(({ value }) => value)).toEqual([3.5]);
    expect(await listConstantsInForce(reader, materialId, '2026-05-03')).toEqual([]);
    const { body } = await people.analyst.client.get(`/materials/${materialId}`);
    expect(body.constants.map(({ recordNumber }: { recordNumber: number }) => recordNumber)).toEqual([2, 1]);
  });

  it('is replaced by one of two engineers who write at once; the other sees what came into force', async () => {
    const materialId = await aMaterial();
    const first = (await record(materialId)).body.constant;
    const change = { replaces: first.id, reason: 'new bars' };
    const answers = await Promise.all([
      record(materialId, { ...change, value: '3.3 MPa m½' }),
      record(materialId, { ...change, value: '3.4 MPa m½' }),
    ]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([201, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.body).toMatchObject({ code: 'stale-version', current: { recordNumber: 2 } });
  });
});

describe('the reach of a constant', () => {
  it('is counted before it is changed, and naming only cases the engineer sees', async () => {
    const materialId = await aMaterial();
    const { id } = (await record(materialId)).body.constant;
    const [open, walled] = [await openedCase(people), await openedCase(people)];
    await anEstimateFrom(id, open.id);
    await anEstimateFrom(id, walled.id);
    await restrict(people, walled.number, []);
    const path = `/materials/${materialId}/constants/${id}/reach`;
    expect((await people.engineer.client.get(path)).body).toEqual({
      ...{ estimates: 2, boundValues: 0, cases: 2, closedCases: 0 },
      casesSeen: [{ number: open.number, state: 'received', estimates: 1 }],
    });
    expect((await people.makerEngineer.client.get(path)).body.code).toBe('not-allowed');
  });

  it('turns stale when another record comes into force, and says from what to what', async () => {
    const materialId = await aMaterial();
    const { id } = (await record(materialId)).body.constant;
    const { id: caseId } = await openedCase(people);
    const estimateId = await anEstimateFrom(id, caseId);
    const change = { value: '3.3 MPa m½', replaces: id, reason: 'new bars' };
    expect((await record(materialId, change)).body.staleCount).toBe(1);
    const { rows } = await server.parts.database.db.execute<{ why: string; case_id: string }>(
      sql`select why, case_id from staleness where record_id = ${estimateId}::uuid`,
    );
    expect(rows[0].case_id).toBe(caseId);
    expect(rows[0].why).toMatch(/^fracture toughness of alumina .* is now 3\.30\s±\s0\.20\sMPa\sm½, was 3\.50/);
  });
});

describe('a material', () => {
  it('is changed from the version seen, or shows what stands now', async () => {
    const materialId = await aMaterial();
    const change = (note: string) => people.engineer.client.patch(`/materials/${materialId}`, { note, versionSeen: 1 });
    expect((await change('from powder PB-7')).body.version).toBe(2);
    expect((await change('from powder PB-8')).body.current.note).toBe('from powder PB-7');
  });
});
