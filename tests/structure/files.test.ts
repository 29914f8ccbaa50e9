import { readdirSync } from 'node:fs';
import { basename } from 'node:path';
import { describe, expect, it } from 'vitest';
import { isTest, readSources } from './source-files.ts';

const sources = readSources(['shared', 'server', 'src', 'tests']);

describe('the files of the project', () => {
  it('stand at the top only where the layout is fixed or a tool demands them', () => {
    const fixed = [
      'README.md',
      'DEVELOPERS.md',
      'package.json',
      'tsconfig.json',
      'vite.config.ts',
      'tailwind.config.ts',
      'drizzle.config.ts',
      'src',
      'server',
      'shared',
      'drizzle',
      'uploads',
      'tests',
      'index.html',
      'eslint.config.js',
      'package-lock.json',
    ];
    const made = ['node_modules', 'dist'];
    const found = readdirSync('.').filter((name) => !name.startsWith('.') && !made.includes(name));
    expect(found.filter((name) => !fixed.includes(name))).toEqual([]);
  });

  it('are named in lower case with hyphens', () => {
    const odd = sources
      .map((source) => source.path)
      .filter((path) => !/^[a-z0-9-]+(\.(test|bench|worker|d))?\.tsx?$/.test(basename(path)));
    expect(odd).toEqual([]);
  });

  it('are never barrels', () => {
    expect(sources.filter((source) => /(^|\/)index\.tsx?$/.test(source.path)).map((source) => source.path)).toEqual([]);
  });

  it('hold only the listed names in a feature of the server', () => {
    const listed =
      /^server\/features\/[a-z-]+\/((routes|service|queries|present|tasks)\.ts|(service|queries|present|routes)\/[a-z0-9-]+\.ts)$/;
    const odd = sources
      .map((source) => source.path)
      .filter((path) => path.startsWith('server/features/') && !isTest(path) && !listed.test(path));
    expect(odd).toEqual([]);
  });

  it('stay short enough to be read at a sitting', () => {
    const long = sources.filter((source) => source.text.split('\n').length > 400).map((source) => source.path);
    expect(long).toEqual([]);
  });
});
