import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { limitSentences, mateOf } from '#server/features/evidence/service/read-evidence.ts';
import { openCase } from '#server/rights/open-case.ts';
import { aCase } from '../support/a-bar-case.ts';
import { anImage, bringIn, settled } from '../support/an-image.ts';
import { closeByHand } from '../support/close-by-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const aPart = {
  description: 'Post insulator',
  serial: null,
  drawing: null,
  maker: null,
  materialId: null,
  environment: null,
  temperatureC: 20,
  serviceTime: '11 years',
};

async function aCaseWithPart() {
  const { id, number } = await aCase(people);
  const { body } = await people.analyst.client.post(`/cases/${number}/evidence/parts`, aPart);
  return { caseId: id, number, at: `/cases/${number}/evidence`, partId: String(body.id) };
}

const aPiece = (partId: string) => ({
  partId,
  parentId: null,
  way: 'break',
  description: 'foot, flange',
  mass: '6.412 kg ± 5 g',
  place: 'safe S2',
  holder: 'Ana Lyst',
  condition: null,
  receivedOn: '2026-06-22',
});

async function receive(at: string, partId: string, more: object = {}) {
  const { body } = await people.analyst.client.post(`${at}/pieces`, { ...aPiece(partId), ...more });
  return body;
}

describe('receiving pieces', () => {
  it('gives every piece its number without gap or duplicate when twenty come in at once', async () => {
    const { at, partId } = await aCaseWithPart();
    const both = [people.analyst.client, people.secondAnalyst.client];
    await Promise.all(Array.from({ length: 20 }, (_, n) => both[n % 2].post(`${at}/pieces`, aPiece(partId))));
    const { body } = await people.analyst.client.get(at);
    const codes = body.pieces.map((piece: { code: string }) => piece.code);
    expect(codes).toEqual(Array.from({ length: 20 }, (_, n) => `F${n + 1}`));
  });

  it('keeps a mass as typed beside its value and interval', async () => {
    const { at, partId } = await aCaseWithPart();
    const piece = await receive(at, partId);
    expect(piece.mass).toEqual({ g: 6412, uncertaintyG: 5, entered: '6.412 kg ± 5 g' });
  });

  it('refuses a mass that does not say how sure it is', async () => {
    const { at, partId } = await aCaseWithPart();
    const answered = await people.analyst.client.post(`${at}/pieces`, { ...aPiece(partId), mass: '6.412 kg' });
    expect(answered).toMatchObject({ status: 422, body: { code: 'not-valid', field: 'mass' } });
  });

  it('names a replica and a section after the piece they were made from', async () => {
    const { at, partId } = await aCaseWithPart();
    const first = await receive(at, partId);
    await receive(at, partId);
    const replica = await receive(at, partId, { way: 'replica', parentId: first.id, mass: '11.8 ± 0.1 g' });
    const section = await receive(at, partId, { way: 'section', parentId: first.id, mass: null });
    expect([replica.code, section.code]).toEqual(['F1/R1', 'F1/S1']);
    const { body } = await people.analyst.client.get(at);
    expect(body.pieces.map((piece: { code: string }) => piece.code)).toEqual(['F1', 'F1/R1', 'F1/S1', 'F2']);
  });

  it('refuses a replica that does not name what it was made from', async () => {
    const { at, partId } = await aCaseWithPart();
    const answered = await people.analyst.client.post(`${at}/pieces`, { ...aPiece(partId), way: 'replica' });
    expect(answered.body).toMatchObject({ code: 'not-valid', field: 'parentId' });
  });

  it('takes no piece of a part of another case', async () => {
    const { at } = await aCaseWithPart();
    const elsewhere = await aCaseWithPart();
    const answered = await people.analyst.client.post(`${at}/pieces`, aPiece(elsewhere.partId));
    expect(answered.status).toBe(404);
  });
});

describe('a piece that is not there', () => {
  it('needs the reason and an answer whether the origin may lie on it', async () => {
    const { at, partId } = await aCaseWithPart();
    const noted = { partId, description: 'slivers along c1', missingReason: '' };
    const answered = await people.analyst.client.post(`${at}/missing`, noted);
    expect(answered.status).toBe(422);
    expect(Object.keys(answered.body.fields)).toEqual(['missingReason', 'originLies']);
  });

  it('sets a limit to the findings until it is known that the origin does not lie on it', async () => {
    const { number, at, partId } = await aCaseWithPart();
    const noted = { partId, description: 'slivers along c1', missingReason: 'swept up with the yard' };
    const { body: missing } = await people.analyst.client.post(`${at}/missing`, { ...noted, originLies: 'not known' });
    await people.analyst.client.post(`${at}/missing`, { ...noted, originLies: 'no' });
    const heldCase = await openCase(people.engineer.context, number, 'read');
    const limits = await limitSentences(people.engineer.context.reader, heldCase);
    expect(limits).toEqual([{ fragmentId: missing.id, code: 'M1', sentence: expect.stringContaining('not known') }]);
  });

  it('keeps its code when it turns up', async () => {
    const { at, partId } = await aCaseWithPart();
    const noted = { partId, description: 'piece of shed 4', missingReason: 'not found', originLies: 'yes' };
    const { body: missing } = await people.analyst.client.post(`${at}/missing`, noted);
    const { body: found } = await people.analyst.client.put(`${at}/pieces/${missing.id}`, {
      version: missing.version,
      status: 'present',
      missingReason: null,
      originLies: null,
      description: noted.description,
      mass: '0.22 kg ± 2 g',
      place: 'safe S2',
      holder: 'Ana Lyst',
      condition: null,
      receivedOn: null,
    });
    expect(found).toMatchObject({ code: 'M1', status: 'present', missingReason: null, originLies: null });
  });
});

describe('two people changing the same thing', () => {
  it('shows the later one the part as it stands, and writes nothing over', async () => {
    const { at, partId } = await aCaseWithPart();
    const path = `${at}/parts/${partId}`;
    await people.secondAnalyst.client.put(path, { ...aPart, serial: 'IP-2231', version: 1 });
    const late = await people.analyst.client.put(path, { ...aPart, serial: 'IP-2237', version: 1 });
    expect(late).toMatchObject({
      status: 409,
      body: { code: 'stale-version', current: { serial: 'IP-2231', version: 2 } },
    });
    const { body } = await people.analyst.client.get(at);
    expect(body.parts[0].serial).toBe('IP-2231');
  });

  it('shows the later one the piece as it stands', async () => {
    const { at, partId } = await aCaseWithPart();
    const piece = await receive(at, partId);
    const { description, place, holder, condition, receivedOn, status, version } = piece;
    const change = {
      description,
      place,
      holder,
      condition,
      receivedOn,
      status,
      version,
      mass: null,
      missingReason: null,
      originLies: null,
    };
    const [one, other] = await Promise.all([
      people.analyst.client.put(`${at}/pieces/${piece.id}`, { ...change, place: 'bench 1' }),
      people.secondAnalyst.client.put(`${at}/pieces/${piece.id}`, { ...change, place: 'bench 2' }),
    ]);
    const [kept, refused] = one.status === 200 ? [one, other] : [other, one];
    expect(kept.status).toBe(200);
    expect(refused.body).toMatchObject({ code: 'stale-version', current: { place: kept.body.place, version: 2 } });
  });
});

describe('mating faces', () => {
  it('are in one pair at most, also when two people pair at once', async () => {
    const { number, at, partId } = await aCaseWithPart();
    const [f1, f2, f3] = [await receive(at, partId), await receive(at, partId), await receive(at, partId)];
    const face = (piece: { id: string }) => ({ fragmentId: piece.id, face: 'A' });
    const answers = await Promise.all([
      people.analyst.client.post(`${at}/mates`, { one: face(f1), other: face(f2), crack: 'c1' }),
      people.secondAnalyst.client.post(`${at}/mates`, { one: face(f3), other: face(f1), crack: null }),
    ]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([201, 409]);
    const heldCase = await openCase(people.analyst.context, number, 'read');
    const mate = await mateOf(people.analyst.context.reader, heldCase.id, f1.id, 'A');
    expect([f2.id, f3.id]).toContain(mate?.fragmentId);
  });

  it('are free again once parted, with the reason kept', async () => {
    const { at, partId } = await aCaseWithPart();
    const [f1, f2] = [await receive(at, partId), await receive(at, partId)];
    const pairing = {
      one: { fragmentId: f1.id, face: 'A' },
      other: { fragmentId: f2.id, face: 'B' },
      crack: null,
    };
    const { body: pair } = await people.analyst.client.post(`${at}/mates`, pairing);
    const unsaid = await people.analyst.client.post(`${at}/mates/${pair.id}/parting`, { version: 1, reason: '' });
    expect(unsaid.status).toBe(422);
    const parting = { version: pair.version, reason: 'the edges do not meet' };
    const { body: parted } = await people.analyst.client.post(`${at}/mates/${pair.id}/parting`, parting);
    expect(parted.partedAt).not.toBeNull();
    expect((await people.analyst.client.post(`${at}/mates/${pair.id}/parting`, parting)).status).toBe(409);
    expect((await people.analyst.client.post(`${at}/mates`, pairing)).status).toBe(201);
  });

  it('lead from a fractograph of the one to one of the other, of the same view where there is one', async () => {
    const { number, at, partId } = await aCaseWithPart();
    const [f1, f2] = [await receive(at, partId), await receive(at, partId)];
    const bytes = await anImage('png', { widthPx: 60, heightPx: 40 });
    const taken = async (fragmentId: string, face: 'A' | 'B', view: string) => {
      const { body } = await bringIn(people.analyst, number, { name: 'face.png', bytes }, { fragmentId, face, view });
      return settled(people.analyst, number, String(body.id));
    };
    const one = await taken(f1.id, 'A', 'origin');
    await taken(f2.id, 'B', 'face');
    const mate = await taken(f2.id, 'B', 'origin');
    const mateIdOf = async (id: string) =>
      (await people.analyst.client.get(`/cases/${number}/fractographs/${id}`)).body.mateId;
    expect(await mateIdOf(one.id)).toBeNull();
    await people.analyst.client.post(`${at}/mates`, {
      one: { fragmentId: f2.id, face: 'B' },
      other: { fragmentId: f1.id, face: 'A' },
      crack: null,
    });
    expect([await mateIdOf(one.id), await mateIdOf(mate.id)]).toEqual([mate.id, one.id]);
  });

  it('are two: no face is its own mate', async () => {
    const { at, partId } = await aCaseWithPart();
    const f1 = await receive(at, partId);
    const face = { fragmentId: f1.id, face: 'A' };
    const answered = await people.analyst.client.post(`${at}/mates`, { one: face, other: face, crack: null });
    expect(answered.body).toMatchObject({ code: 'not-valid', field: 'other' });
  });
});

describe('who may change the pieces of a case', () => {
  it('is an analyst of the laboratory; an engineer and a manager read the reason why not', async () => {
    const { at } = await aCaseWithPart();
    for (const { client } of [people.engineer, people.manager]) {
      const answered = await client.post(`${at}/parts`, aPart);
      expect(answered).toMatchObject({ status: 403, body: { message: expect.stringContaining('analyst') } });
      const { status, body } = await client.get(at);
      expect([status, body.change.allowed]).toEqual([200, false]);
      expect(body.change.reason).toContain('analyst');
    }
  });

  it('is no outsider: for them nothing is there', async () => {
    const { at } = await aCaseWithPart();
    for (const { client } of [people.outsider, people.administrator]) {
      const read = await client.get(at);
      const nowhere = await client.get(`/cases/HB-2026-9999/evidence`);
      expect([read.status, read.body]).toEqual([404, nowhere.body]);
      expect((await client.post(`${at}/parts`, aPart)).status).toBe(404);
    }
  });

  it('is no one once the case is sealed', async () => {
    const { caseId, at, partId } = await aCaseWithPart();
    await closeByHand(server, caseId);
    const answered = await people.analyst.client.post(`${at}/pieces`, aPiece(partId));
    expect(answered).toMatchObject({ status: 409, body: { code: 'closed-case' } });
    const { body } = await people.analyst.client.get(at);
    expect(body).toMatchObject({ pieces: [], change: { allowed: false }, closedAt: expect.any(String) });
  });

  it('does the same act once, however often it is sent', async () => {
    const { at, partId } = await aCaseWithPart();
    const actId = randomUUID();
    await people.analyst.client.post(`${at}/pieces`, aPiece(partId), actId);
    const again = await people.analyst.client.post(`${at}/pieces`, aPiece(partId), actId);
    expect(again.body.code).toBe('already-done');
  });
});
