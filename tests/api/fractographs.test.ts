import { createHash } from 'node:crypto';
import { request as httpRequest } from 'node:http';
import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { dropRefused } from '#server/features/fractographs/service/drop-refused.ts';
import { cutTiles } from '#server/features/fractographs/service/cut-tiles.ts';
import { visitorContext } from '#server/http/context.ts';
import { pyramidOf, tilesOfLevel } from '#shared/numeric/imaging/pyramid.ts';
import { aCase } from '../support/a-bar-case.ts';
import { aReadyImage, anImage, bringIn, settled, type ImageKind } from '../support/an-image.ts';
import { closeByHand } from '../support/close-by-hand.ts';
import { aLaboratory, startTestServer, type TestServer } from '../support/test-server.ts';

let server: TestServer;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  const environment = { HACKLEBOOK_LARGEST_FILE_MB: '3', HACKLEBOOK_LARGEST_IMAGE_MPX: '2' };
  server = await startTestServer({ environment });
  people = await aLaboratory(server);
});
afterAll(() => server.stop());

const hashOf = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

/** Every file in the folders where bytes arrive and stay. */
async function keptNames(): Promise<string[]> {
  const list = (room: string) =>
    readdir(join(server.uploadsFolder, room), { recursive: true, withFileTypes: true }).catch(() => []);
  const names = [...(await list('arriving')), ...(await list('originals'))];
  return names.filter((entry) => entry.isFile()).map((entry) => join(entry.parentPath, entry.name));
}

describe('a file brought in', () => {
  const kinds: ImageKind[] = [
    'tiff',
    'tiff 16 bit',
    'big tiff',
    'big tiff 16 bit',
    'png',
    'png 16 bit',
    'jpeg',
    'webp',
  ];

  it.each(kinds)('as %s gets its figure number at once and its tiles soon after', async (kind) => {
    const { number } = await aCase(people);
    const bytes = await anImage(kind);
    const { status, body } = await bringIn(people.analyst, number, { name: 'größe 7 µm.dat', bytes });
    expect(status).toBe(202);
    expect(body).toMatchObject({
      figureNumber: 1,
      fileName: 'größe 7 µm.dat',
      sha256: hashOf(bytes),
    });
    const image = await settled(people.analyst, number, body.id);
    expect(image.refusedReason).toBeNull();
    expect(image).toMatchObject({
      state: 'ready',
      widthPx: 600,
      heightPx: 400,
      bitDepth: kind.endsWith('16 bit') ? 16 : 8,
    });
  });

  it('comes back bit for bit under its own name', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('big tiff 16 bit');
    const { body } = await bringIn(people.analyst, number, { name: 'origin "A" ½.tif', bytes });
    const back = await people.manager.client.get(`/cases/${number}/fractographs/${body.id}/original`);
    expect(hashOf(back.body)).toBe(hashOf(bytes));
    expect(back.headers.get('x-sha256')).toBe(hashOf(bytes));
    expect(back.headers.get('content-disposition')).toContain("filename*=UTF-8''origin%20%22A%22%20%C2%BD.tif");
  });

  it('takes its caption, face and view along', async () => {
    const { number } = await aCase(people);
    const fields = { caption: 'Origin, low power', face: 'A', view: 'origin' };
    const { body } = await bringIn(people.analyst, number, { name: 'a.png', bytes: await anImage('png') }, fields);
    expect(body).toMatchObject(fields);
  });

  it('a second time in one case is taken and pointed out', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('png');
    const first = await bringIn(people.analyst, number, { name: 'a.png', bytes });
    const second = await bringIn(people.analyst, number, { name: 'b.png', bytes });
    expect(second.status).toBe(202);
    expect(second.body.sameBytesAs).toEqual([{ id: first.body.id, figureNumber: 1 }]);
  });

  it('at the same moment as another gets the next figure number, without gap', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('png');
    const answers = await Promise.all(
      [people.analyst, people.secondAnalyst, people.analyst].map((person) =>
        bringIn(person, number, { name: 'a.png', bytes }),
      ),
    );
    expect(answers.map(({ body }) => body.figureNumber).sort()).toEqual([1, 2, 3]);
  });

  it('once more after a lost answer does not come in twice', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('png', { widthPx: 31, heightPx: 17 });
    const actId = 'c0ffee00-0000-4000-8000-000000000001';
    const statuses = [];
    for (let time = 0; time < 2; time++) {
      const { status } = await people.analyst.client.sendFile(
        `/cases/${number}/fractographs`,
        { name: 'a.png', bytes },
        {},
        actId,
      );
      statuses.push(status);
    }
    expect(statuses).toEqual([202, 409]);
    const list = await people.analyst.client.get(`/cases/${number}/fractographs`);
    expect(list.body).toHaveLength(1);
    const back = await people.analyst.client.get(`/cases/${number}/fractographs/${list.body[0].id}/original`);
    expect(hashOf(back.body)).toBe(hashOf(bytes));
  });
});

describe('a file that does not come in', () => {
  it('because the case was closed meanwhile leaves no bytes', async () => {
    const { id, number } = await aCase(people);
    const bytes = await anImage('png', { widthPx: 33, heightPx: 21 });
    await closeByHand(server, id);
    const { status, body } = await bringIn(people.analyst, number, { name: 'late.png', bytes });
    expect([status, body.code]).toEqual([409, 'closed-case']);
    expect((await keptNames()).join(' ')).not.toContain(hashOf(bytes));
  });

  it('because its form names a piece of no such case leaves no bytes', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('png', { widthPx: 35, heightPx: 21 });
    const fields = { fragmentId: 'c0ffee00-0000-4000-8000-00000000000f' };
    const { status, body } = await bringIn(people.analyst, number, { name: 'x.png', bytes }, fields);
    expect([status, body.field]).toEqual([422, 'fragmentId']);
    expect((await keptNames()).join(' ')).not.toContain(hashOf(bytes));
  });

  it('because it is too large leaves nothing', async () => {
    const { number } = await aCase(people);
    const before = await keptNames();
    const { status, body } = await bringIn(people.analyst, number, { name: 'x.tif', bytes: Buffer.alloc(3.2e6, 7) });
    expect([status, body.code]).toEqual([413, 'too-large']);
    expect(await keptNames()).toEqual(before);
  });

  it('because the connection fell away leaves nothing', async () => {
    const { number } = await aCase(people);
    const before = await keptNames();
    const { client } = people.analyst;
    const boundary = 'a-part-of-the-form';
    await new Promise<void>((done) => {
      const sending = httpRequest(`${server.address}/api/cases/${number}/fractographs`, {
        method: 'POST',
        headers: { ...client.headers(), 'content-type': `multipart/form-data; boundary=${boundary}` },
      });
      sending.on('error', () => done());
      sending.write(`--${boundary}\r\nContent-Disposition: form-data; name="file"; filename="half.tif"\r\n\r\n`);
      sending.write(Buffer.alloc(300_000, 1), () => setTimeout(() => sending.destroy(), 100));
    });
    await wait(300);
    expect(await keptNames()).toEqual(before);
    expect((await client.get(`/cases/${number}/fractographs`)).body).toEqual([]);
  });
});

describe('a file refused for what is in it', () => {
  const refusedAs = async (name: string, bytes: Uint8Array) => {
    const { number } = await aCase(people);
    const { status, body } = await bringIn(people.analyst, number, { name, bytes });
    expect(status).toBe(202);
    const image = await settled(people.analyst, number, body.id);
    expect(image).toMatchObject({ state: 'refused', fileName: name, sha256: hashOf(bytes) });
    return image.refusedReason;
  };

  it('because its end is missing says so', async () => {
    const jpeg = await anImage('jpeg');
    expect(await refusedAs('half.jpg', jpeg.slice(0, jpeg.length * 0.6))).toMatch(/end is missing or it is damaged/);
    const tiff = await anImage('tiff');
    expect(await refusedAs('half.tif', tiff.slice(0, tiff.length * 0.6))).toMatch(/end is missing or it is damaged/);
  });

  it('because it is text under the name of an image says so', async () => {
    expect(await refusedAs('notes.tif', Buffer.from('load 421 N\n'))).toMatch(/not an image file/);
  });

  it('because it is HEIC, GIF, PDF or SVG says which', async () => {
    const heic = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from('ftypheic'), Buffer.alloc(40)]);
    expect(await refusedAs('a.jpg', heic)).toMatch(/HEIC/);
    expect(await refusedAs('a.png', Buffer.from('GIF89a......'))).toMatch(/GIF/);
    expect(await refusedAs('a.tif', Buffer.from('%PDF-1.7 ....'))).toMatch(/PDF/);
    expect(await refusedAs('a.tif', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'))).toMatch(/drawing/);
  });

  it('because it has too many pixels says how many are taken', async () => {
    const large = await anImage('jpeg', { widthPx: 2000, heightPx: 1200 });
    expect(await refusedAs('large.jpg', large)).toMatch(/2\.4 megapixels; this laboratory takes up to 2\./);
  });

  it('keeps its bytes for a week, and for longer where they serve another image', async () => {
    const { number } = await aCase(people);
    const bytes = Buffer.from('load 422 N\n');
    const { body } = await bringIn(people.analyst, number, { name: 'notes.tif', bytes });
    await settled(people.analyst, number, body.id);
    const path = `/cases/${number}/fractographs/${body.id}/original`;
    const afterDays = (days: number) =>
      visitorContext({ ...server.parts, clock: () => new Date(Date.now() + days * 24 * 3600 * 1000) });
    await dropRefused(afterDays(6), hashOf(bytes));
    expect((await people.analyst.client.get(path)).status).toBe(200);
    await dropRefused(afterDays(8), hashOf(bytes));
    expect((await people.analyst.client.get(path)).status).toBe(404);
    const kept = await anImage('png', { widthPx: 37, heightPx: 21 });
    const image = await aReadyImage(people.analyst, number, kept);
    await dropRefused(afterDays(8), hashOf(kept));
    expect((await people.analyst.client.get(`/cases/${number}/fractographs/${image.id}/original`)).status).toBe(200);
  });
});

describe('the tiles of a fractograph', () => {
  it('are those that the pyramid states, each of its size, and no others', async () => {
    const { number } = await aCase(people);
    const size = { widthPx: 1301, heightPx: 777 };
    const image = await aReadyImage(people.analyst, number, await anImage('tiff', size));
    const at = `/cases/${number}/fractographs/${image.id}/tiles`;
    const pyramid = pyramidOf(size);
    for (const level of pyramid.levels) {
      for (const tile of tilesOfLevel(pyramid, level)) {
        const { status, body } = await people.analyst.client.get(`${at}/${level.level}/${tile.column}_${tile.row}`);
        expect(status).toBe(200);
        const { width, height } = await sharp(body).metadata();
        expect({ width, height }).toEqual({ width: tile.levelRectPx.width, height: tile.levelRectPx.height });
      }
      expect((await people.analyst.client.get(`${at}/${level.level}/${level.columns}_0`)).status).toBe(404);
    }
    expect((await people.analyst.client.get(`${at}/${pyramid.levels.length}/0_0`)).status).toBe(404);
  });

  it('of 16-bit grey stay grey and run from the least to the largest sample found', async () => {
    const { number } = await aCase(people);
    const size = { widthPx: 256, heightPx: 64 };
    const image = await aReadyImage(people.analyst, number, await anImage('tiff 16 bit', size));
    expect(image.format).toBe('TIFF, 16 bit, shown linearly from 900 to 3894');
    const { body } = await people.analyst.client.get(`/cases/${number}/fractographs/${image.id}/tiles/0/0_0`);
    const { channels } = await sharp(body).metadata();
    const [{ min, max }] = (await sharp(body).stats()).channels;
    expect(channels).toBe(1);
    expect(min).toBeLessThan(4);
    expect(max).toBeGreaterThan(251);
  });

  it('are kept by the browser of the one who asked, and asked for afresh without their bytes', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('png'));
    const path = `/cases/${number}/fractographs/${image.id}/tiles/0/0_0`;
    const first = await people.analyst.client.get(path);
    expect(first.headers.get('cache-control')).toBe('private, max-age=31536000, immutable');
    const again = await fetch(`${server.address}/api${path}`, {
      headers: { ...people.analyst.client.headers(), 'if-none-match': first.headers.get('etag') ?? '' },
    });
    expect(again.status).toBe(304);
  });

  it('come the same from a second run, and a ready image is not cut again', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('jpeg'));
    const before = await people.analyst.client.get(`/cases/${number}/fractographs/${image.id}/tiles/1/0_0`);
    await cutTiles(visitorContext(server.parts), image.id);
    const after = await people.analyst.client.get(`/cases/${number}/fractographs/${image.id}`);
    expect(after.body.version).toBe(image.version);
    const tile = await people.analyst.client.get(`/cases/${number}/fractographs/${image.id}/tiles/1/0_0`);
    expect(hashOf(tile.body)).toBe(hashOf(before.body));
  });
});

describe('the pictures of a fractograph', () => {
  it('show the whole and a part around a point at the size asked for', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('tiff', { widthPx: 1300, heightPx: 900 }));
    const at = `/cases/${number}/fractographs/${image.id}`;
    const preview = await people.analyst.client.get(`${at}/preview?width=300`);
    expect(await sharp(preview.body).metadata()).toMatchObject({ width: 320, height: 222 });
    const crop = await people.analyst.client.get(`${at}/crop?x=1290&y=450&width=64&height=48&across=200`);
    expect(await sharp(crop.body).metadata()).toMatchObject({ format: 'webp', width: 64, height: 48 });
  });
});

describe('an outsider', () => {
  it('finds nothing under any address of a fractograph', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('png'));
    const at = `/cases/${number}/fractographs`;
    const paths = ['', '/tiles/0/0_0', '/preview', '/crop?x=9&y=9', '/original', '/calibrations'];
    for (const path of [at, ...paths.map((path) => `${at}/${image.id}${path}`)]) {
      const { status, body } = await people.outsider.client.get(path);
      expect([path, status, body.code]).toEqual([path, 404, 'not-found']);
    }
    const sent = await bringIn(people.outsider, number, { name: 'a.png', bytes: await anImage('png') });
    expect(sent.status).toBe(404);
  });

  it('finds nothing of another case through a case of their own', async () => {
    const [own, other] = [await aCase(people), await aCase(people)];
    const image = await aReadyImage(people.analyst, other.number, await anImage('png'));
    const { status } = await people.analyst.client.get(`/cases/${own.number}/fractographs/${image.id}/tiles/0/0_0`);
    expect(status).toBe(404);
  });
});

describe('what is said of a fractograph', () => {
  it('is kept under a version, and a save from an older one shows both', async () => {
    const { number } = await aCase(people);
    const image = await aReadyImage(people.analyst, number, await anImage('png'));
    const path = `/cases/${number}/fractographs/${image.id}`;
    const said = { caption: 'Origin at the edge', tiltDeg: 12, versionSeen: image.version };
    const kept = await people.analyst.client.patch(path, said);
    expect(kept.body).toMatchObject({ caption: 'Origin at the edge', tiltDeg: 12, version: image.version + 1 });
    const late = await people.secondAnalyst.client.patch(path, { caption: 'Mine', versionSeen: image.version });
    expect([late.status, late.body.code]).toEqual([409, 'stale-version']);
    expect(late.body.current.caption).toBe('Origin at the edge');
  });
});

describe('the scale a file tells of itself', () => {
  it.each([
    ['tiff', /^TIFF resolution 25\s?600 px\/cm$/],
    ['big tiff', /^BigTIFF resolution 25\s?600 px\/cm$/],
    ['png', /^PNG resolution .* px\/m$/],
    ['jpeg', /^JPEG resolution 65\s?024 px\/inch$/],
  ] as const)('is read from %s in words and is not bound by itself', async (kind, words) => {
    const { number } = await aCase(people);
    const pixelsPerMm = 2560;
    const bytes = await anImage(kind, { widthPx: 80, heightPx: 60 }, { pixelsPerMm });
    const image = await aReadyImage(people.analyst, number, bytes);
    expect(image.tagPixelSizeUm).toBeCloseTo(1000 / pixelsPerMm, 4);
    expect(image.tagSource).toMatch(words);
    expect(image.scale).toBeNull();
  });

  it('is not taken from the resolution of a program that knows none', async () => {
    const { number } = await aCase(people);
    const bytes = await anImage('png', { widthPx: 80, heightPx: 60 }, { pixelsPerMm: 72 / 25.4 });
    expect((await aReadyImage(people.analyst, number, bytes)).tagPixelSizeUm).toBeNull();
  });
});
