import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { Reckoning } from '#shared/contracts/reckonings.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const mirror = {
  id: 'M001',
  method: 'mirror.stress',
  inputs: { A: { value: 2, unit: 'MPa*sqrt(m)' }, R: { value: 0.45, unit: 'mm' } },
};
const drawn = {
  ...mirror,
  method: 'montecarlo.mirror',
  inputs: {
    ...mirror.inputs,
    u_A: { value: 0.1, unit: 'MPa*sqrt(m)' },
    u_R: { value: 0.03, unit: 'mm' },
  },
};

describe('a reckoning outside a case', () => {
  it('is given to an engineer of the maker too, and keeps nothing', async () => {
    const { status, body } = await people.makerEngineer.client.post('/reckonings', [mirror]);
    expect(status).toBe(200);
    const [answer] = z.array(Reckoning).parse(body);
    expect(answer).toMatchObject({ id: 'M001', outputs: { stress: { value: expect.closeTo(94.280904, 5) } } });
  });

  it('is refused in its place, beside others that are given', async () => {
    const wrong = { ...mirror, id: 'R018', inputs: { ...mirror.inputs, R: { value: 0, unit: 'mm' } } };
    const { body } = await people.analyst.client.post('/reckonings', [wrong, mirror]);
    expect(body[0]).toEqual({ id: 'R018', refused: 'non-positive-mirror-radius', field: 'R' });
    expect(body[1]).toHaveProperty('outputs');
  });

  it('draws a Monte Carlo, the same digits twice', async () => {
    const { body } = await people.analyst.client.post('/reckonings', [drawn, drawn]);
    expect(body[0].outputs.standardDeviation.value).toBeCloseTo(5.69, 1);
    expect(body[0]).toEqual(body[1]);
  });

  it('does not draw so much that others wait', async () => {
    const { body } = await people.analyst.client.post('/reckonings', [drawn, drawn, drawn]);
    expect(body[0]).toEqual({ id: 'M001', refused: 'outside-validity-range', field: 'draws' });
  });

  it('is not read without the unit of an input', async () => {
    const bare = { ...mirror, inputs: { ...mirror.inputs, R: { value: 0.45 } } };
    const { status, body } = await people.analyst.client.post('/reckonings', [bare]);
    expect(status).toBe(422);
    expect(body).toMatchObject({ code: 'not-valid', field: '0.inputs.R.unit' });
  });

  it('is not for a requester', async () => {
    expect((await people.requester.client.post('/reckonings', [mirror])).status).toBe(403);
  });
});
