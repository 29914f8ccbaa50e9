import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { Reckoning } from '#shared/contracts/reckonings.ts';
import { agrees, checkValues } from './check-values.ts';
import { canRun } from './run-check-value.ts';

let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'hacklebook-reckon-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

/** Runs the command as `npm run reckon` does; what it prints, or its failure. */
async function reckon(...parameters: string[]): Promise<{ printed: string; told: string; code: number }> {
  const run = promisify(execFile)(process.execPath, ['server/bin/reckon.mjs', ...parameters], {
    env: { ...process.env, INIT_CWD: process.cwd() },
    maxBuffer: 16 * 1024 * 1024,
  });
  try {
    const { stdout, stderr } = await run;
    return { printed: stdout, told: stderr, code: 0 };
  } catch (failure) {
    const Told = z.object({ stdout: z.string(), stderr: z.string(), code: z.number() });
    const { stdout, stderr, code } = Told.parse(failure);
    return { printed: stdout, told: stderr, code };
  }
}

async function aFile(content: string): Promise<string> {
  const path = join(folder, 'list.json');
  await writeFile(path, content);
  return path;
}

describe('the command that reckons a file', () => {
  it('gives every reference value of the methods there are, in its unit', async () => {
    const { printed } = await reckon('tests/reference/check-values.json');
    const reckonings = z.array(Reckoning).parse(JSON.parse(printed));
    expect(reckonings.map(({ id }) => id)).toEqual(checkValues.map(({ id }) => id));
    const wrong = checkValues.flatMap(({ id, method, expected, tolerance }, index) => {
      const answer = reckonings[index];
      if (!canRun(method) || !answer) return [];
      if ('refused' in answer) return answer.refused === expected.refusal?.value ? [] : [`${id} ${answer.refused}`];
      return Object.entries(expected).flatMap(([name, { value, unit }]) => {
        const found = answer.outputs[name];
        return found?.unit === unit && agrees(found.value, value, tolerance) ? [] : [`${id} ${name}`];
      });
    });
    expect(wrong).toEqual([]);
  });

  it('refuses one of a list and reckons the others', async () => {
    const quantity = (value: number) => ({ value, unit: 'mm' });
    const radii = (left: number) => ({ leftRadius: quantity(left), rightRadius: quantity(0.4) });
    const method = 'mirror.averageRadius.surface';
    const list = [
      { id: 'a', method, inputs: radii(0.2) },
      { id: 'b', method, inputs: radii(0) },
      { id: 'c', method: 'mirror.size', inputs: {} },
    ];
    const { printed, code } = await reckon(await aFile(JSON.stringify(list)));
    expect(code).toBe(0);
    expect(JSON.parse(printed)).toEqual([
      { id: 'a', outputs: { R: { value: expect.closeTo(0.3, 12), unit: 'mm' } }, cautions: [] },
      { id: 'b', refused: 'non-positive-mirror-radius', field: 'leftRadius' },
      { id: 'c', refused: 'unknown-method', field: 'mirror.size' },
    ]);
  });

  it.each([
    ['what is no JSON', 'list:', /is not JSON/],
    ['what is no list', '{"id":"a"}', /is not a list of \{ id, method, inputs \}/],
    ['an input without its unit', '[{"id":"a","method":"b","inputs":{"R":{"value":1}}}]', /0\.inputs\.R\.unit/],
  ])('says in a sentence what is wrong with %s', async (_what, content, sentence) => {
    const { printed, told, code } = await reckon(await aFile(content));
    expect({ printed, code }).toEqual({ printed: '', code: 1 });
    expect(told).toMatch(sentence);
  });

  it('asks for one file that is there', async () => {
    expect((await reckon()).told).toMatch(/Name one file/);
    expect((await reckon(join(folder, 'none.json'))).told).toMatch(/There is no file/);
  });
});
