import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { CasebookPage } from '#shared/contracts/casebook.ts';
import { ClosureCheckView } from '#shared/contracts/closure.ts';
import { EstimatesView, type EstimateView } from '#shared/contracts/estimates.ts';
import { BoundValueList } from '#shared/contracts/findings.ts';
import { FractographList } from '#shared/contracts/fractographs.ts';
import { demoCases } from '#server/database/demo/story.ts';
import { demoPassword, demoPeople } from '#server/database/demo/people.ts';
import { seedDemo } from '#server/database/seed.ts';
import { recomputeEstimate } from '#server/features/estimates/service/recompute-estimate.ts';
import { visitorContext } from '#server/http/context.ts';
import type { ApiClient } from '../support/api-client.ts';
import { startTestServer, type TestServer } from '../support/test-server.ts';

// Images a quarter as wide: the same pieces at the same lengths, drawn and cut in a sixteenth of the time.
const pixelFactor = 4;
const longestSeedMs = 180_000;
const filesBeforeFull = 12;
const closedCases = ['0001', '0002', '0003', '0008', '0011', '0012'];

let server: TestServer;
let analyst: ApiClient;
let brokenOff: string[];
let told: string[];
const progress: string[] = [];

const seed = () =>
  seedDemo(server.parts, visitorContext(server.parts), { pixelFactor, onProgress: (words) => progress.push(words) });

/** Tells the story until the disk takes no more, in the middle of a case. */
async function seedUntilDiskIsFull(mostFiles: number): Promise<string[]> {
  const { storage } = server.parts;
  let files = 0;
  const keepOriginal: typeof storage.keepOriginal = (stream) => {
    files += 1;
    return files > mostFiles ? Promise.reject(new Error('the disk is full')) : storage.keepOriginal(stream);
  };
  server.parts.storage = { ...storage, keepOriginal };
  try {
    return await seed();
  } finally {
    server.parts.storage = storage;
  }
}

beforeAll(async () => {
  server = await startTestServer();
  brokenOff = await seedUntilDiskIsFull(filesBeforeFull);
  progress.length = 0;
  told = await seed();
  analyst = await signedIn('analyst-oxide@marrowdene.example');
}, longestSeedMs);
afterAll(() => server.stop());

async function signedIn(mail: string): Promise<ApiClient> {
  const client = server.visitor();
  await client.signIn(mail, demoPassword);
  return client;
}

const pathOf = (code: string) => `/cases/HB-2026-${code}`;
const bodyOf = async (path: string, client = analyst) => (await client.get(path)).body;
const estimatesOf = async (code: string) => EstimatesView.parse(await bodyOf(`${pathOf(code)}/estimates`));

/** The stress as the scenario prints it: to 0.1 MPa, its interval to 0.2 MPa; a large one to a whole MPa. */
function expectStress(estimate: EstimateView | undefined, value: number, expanded: number) {
  const isPrintedWhole = value >= 1000;
  const difference = Math.abs((estimate?.origin.value ?? 0) - value);
  expect(difference).toBeLessThanOrEqual(isPrintedWhole ? 0.5 : 0.1);
  const ofInterval = Math.abs((estimate?.origin.expandedUncertainty ?? 0) - expanded);
  expect(ofInterval).toBeLessThanOrEqual(isPrintedWhole ? 0.5 : 0.2);
}

describe('the demo', () => {
  it('says plainly that it is there only in part when it was broken off', () => {
    expect(brokenOff[0]).toBe('The demo is there only in part: the disk is full. The next start goes on with it.');
  });

  it('is told to its end at the next start, with its accounts and their password', async () => {
    expect(told[0]).not.toContain('only in part');
    expect(told[0]).toContain(demoPassword);
    for (const { mail } of demoPeople) expect(told.join('\n')).toContain(mail);
    expect(progress).toHaveLength(demoCases.length);
    expect(progress).toContain('Demo: case 4 of 12');
    for (const { mail } of demoPeople) await signedIn(mail);
  });

  it('holds twelve cases, received a week apart, each in the state its story has come to', async () => {
    const { rows } = CasebookPage.parse(await bodyOf('/cases?order=number&year=any'));
    const byNumber = new Map(rows.map((row) => [String(row.number), row]));
    expect(byNumber.size).toBe(12);
    const first = Date.UTC(2026, 4, 4);
    for (const [index, { code, end, closedOn }] of demoCases.entries()) {
      const view = await bodyOf(pathOf(code));
      expect([code, view.state]).toEqual([code, end]);
      expect(view.receivedAt.slice(0, 10)).toBe(new Date(first + index * 7 * 86_400_000).toISOString().slice(0, 10));
      if (closedOn) expect(view.closedAt.slice(0, 10)).toBe(closedOn);
    }
  });

  it('shows every fractograph ready, taken by someone, and on a scale of the laboratory', async () => {
    for (const { code } of demoCases) {
      const images = FractographList.parse(await bodyOf(`${pathOf(code)}/fractographs`));
      expect(images.length).toBeGreaterThan(0);
      for (const image of images) {
        expect(image).toMatchObject({ state: 'ready', takenOn: expect.stringMatching(/^2026-/) });
        expect(image.fragment?.code).toMatch(/^F[12]$/);
        expect(image.scale?.code).toMatch(/^CAL-0[1-7]$/);
      }
    }
  });
});

describe('the verdicts of the demo', () => {
  const asked = '/casebook/verdicts?numbers=HB-2026-0001,HB-2026-0006,HB-2026-0011';

  it('stand in the Casebook for every case with a line in force', async () => {
    expect(await bodyOf(asked)).toEqual([
      { number: 'HB-2026-0001', verdict: 'agree' },
      { number: 'HB-2026-0006', verdict: 'disagree' },
    ]);
  });

  it('are told neither to a requester nor to an administrator', async () => {
    for (const mail of ['quality-manager@ostrevell.example', 'administrator@marrowdene.example'])
      expect(await bodyOf(asked, await signedIn(mail))).toEqual([]);
  });
});

describe('the estimates of the demo', () => {
  it.each([
    ['0001', 'load', 1, 350.0, 14.0],
    ['0001', 'mirror', 1, 359.2, 33.3],
    ['0001', 'flaw', 1, 339.1, 56.4],
    ['0002', 'mirror', 1, 196.0, 18.2],
    ['0002', 'flaw', 1, 185.0, 38.5],
    ['0003', 'load', 1, 186.8, 8.4],
    ['0003', 'mirror', 1, 192.5, 17.8],
    ['0003', 'flaw', 1, 222.2, 46.2],
    ['0004', 'load', 1, 311.3, 12.5],
    ['0004', 'mirror', 1, 283.3, 26.2],
    ['0004', 'flaw', 1, 452.2, 75.2],
    ['0004', 'load', 2, 273.8, 12.1],
    ['0004', 'mirror', 2, 278.7, 25.8],
    ['0004', 'flaw', 2, 289.3, 60.2],
    ['0005', 'load', 1, 57.6, 2.3],
    ['0005', 'mirror', 1, 40.7, 2.8],
    ['0005', 'flaw', 1, 42.2, 6.4],
    ['0005', 'mirror', 2, 57.5, 3.9],
    ['0005', 'flaw', 2, 59.6, 9.0],
    ['0006', 'load', 1, 202.0, 12.1],
    ['0006', 'mirror', 1, 111.2, 8.3],
    ['0006', 'flaw', 1, 105.3, 17.4],
    ['0007', 'mirror', 1, 565.3, 78.1],
    ['0007', 'flaw', 1, 531.6, 121.2],
    ['0008', 'flaw', 1, 21.0, 4.0],
    ['0009', 'flaw', 1, 2327, 484],
    ['0010', 'load', 1, 73.8, 3.0],
    ['0010', 'load', 2, 328.3, 13.1],
    ['0010', 'mirror', 1, 323.6, 30.0],
    ['0010', 'flaw', 1, 334.0, 55.5],
    ['0012', 'mirror', 1, 46.1, 3.7],
    ['0012', 'flaw', 1, 44.3, 7.9],
  ] as const)('of case %s, %s line, reading %i, are %d ± %d MPa', async (code, line, reading, value, expanded) => {
    const { estimates } = await estimatesOf(code);
    const ofLine = estimates.filter((estimate) => estimate.line === line);
    expectStress(ofLine[reading - 1], value, expanded);
  });

  it('can each be reckoned again to the last digit', async () => {
    for (const { code } of demoCases)
      for (const { id } of (await estimatesOf(code)).estimates)
        expect(await recomputeEstimate(server.parts.database, id)).toMatchObject({ same: true });
  });

  it('agree once the second reader found the origin, the scale was right, and the load had its unit', async () => {
    for (const code of ['0001', '0002', '0003', '0004', '0005', '0010', '0012'])
      expect([code, (await estimatesOf(code)).agreement.verdict]).toEqual([code, 'agree']);
    expect((await estimatesOf('0006')).agreement.verdict).toBe('disagree');
    expect((await estimatesOf('0011')).agreement.verdict).toBe('too few');
  });

  it('of 0001 and 0012 are stale since the scale was replaced, and say what they would be', async () => {
    const lines = async (code: string, line: string) =>
      (await estimatesOf(code)).estimates.find((estimate) => estimate.line === line);
    for (const [code, line, wouldBe] of [
      ['0001', 'mirror', 356.0],
      ['0001', 'flaw', 336.1],
      ['0012', 'mirror', 45.7],
      ['0012', 'flaw', 43.9],
    ] as const) {
      const stale = (await lines(code, line))?.stale;
      expect(stale?.since.slice(0, 10)).toBe('2026-10-05');
      expect(stale?.causes[0].why).toContain('Reference scale found 1.8 % out');
      expect(Math.abs((stale?.wouldBe?.value ?? 0) - wouldBe)).toBeLessThanOrEqual(0.1);
    }
    expect((await lines('0001', 'load'))?.stale).toBeNull();
  });

  it('of 0005 left the sentences that were bound on the wrong scale stale', async () => {
    const values = BoundValueList.parse(await bodyOf(`${pathOf('0005')}/findings/bound-values`));
    expect(values.filter(({ stale }) => stale !== null)).toHaveLength(6);
  });
});

describe('the closed cases of the demo', () => {
  it('are found whole when looked over again, stale or not', async () => {
    for (const code of closedCases) {
      const check = ClosureCheckView.parse(await bodyOf(`${pathOf(code)}/review/check`));
      expect([code, check.whole]).toEqual([code, true]);
      expect(check.files.length).toBeGreaterThan(0);
    }
  });

  it('refuse every write', async () => {
    const path = `${pathOf('0001')}/fractographs`;
    const [image] = FractographList.parse(await bodyOf(path));
    const { body } = await analyst.patch(`${path}/${image.id}`, { caption: 'another', versionSeen: image.version });
    expect(body.code).toBe('closed-case');
  });

  it('were approved by a manager who worked on none of them', async () => {
    for (const code of closedCases) {
      const { signatures } = await bodyOf(`${pathOf(code)}/review`);
      expect(signatures.map(({ meaning }: { meaning: string }) => meaning).sort()).toEqual(['approved', 'authored']);
    }
  });
});

describe('the trail of the demo', () => {
  it('is chained without a break in the laboratory and in every case', async () => {
    const administrator = await signedIn('administrator@marrowdene.example');
    const { body } = await administrator.get('/trail/check');
    expect(body).toMatchObject({ broken: [], entries: expect.any(Number) });
  });

  it('never says a day outside the story', async () => {
    const { entries } = await bodyOf(`${pathOf('0012')}/history`);
    for (const { at } of entries) expect(at.slice(0, 10) <= '2026-10-19').toBe(true);
  });

  it('does not grow when the server starts again', async () => {
    const before = await bodyOf(`${pathOf('0004')}/history`);
    expect(await seed()).toEqual(told);
    expect(await bodyOf(`${pathOf('0004')}/history`)).toEqual(before);
    expect((await estimatesOf('0004')).estimates).toHaveLength(6);
  });
});
