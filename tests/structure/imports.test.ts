import { describe, expect, it } from 'vitest';
import { isTest, readSources, type SourceFile } from './source-files.ts';

const sources = readSources().filter((source) => !isTest(source.path));
const within = (...rooms: string[]) => sources.filter((source) => rooms.some((room) => source.path.startsWith(room)));

/** Breaches as "file imports what", so that a failure says where to look. */
function breaches(files: SourceFile[], isAllowed: (imported: string, file: SourceFile) => boolean): string[] {
  return files.flatMap((file) =>
    file.imports.filter((imported) => !isAllowed(imported, file)).map((imported) => `${file.path} imports ${imported}`),
  );
}

const isPackage = (imported: string) => !/^(shared|server|src|tests)\//.test(imported);

// A feature may use those before it; what must flow the other way goes through the lineage table.
const featureOrder = [
  'people',
  'laboratory',
  'materials',
  'lots',
  'cases',
  'evidence',
  'fractographs',
  'marks',
  'estimates',
  'reasoning',
  'findings',
  'closure',
  'actions',
  'look-back',
];
const featureOf = (path: string) => /^(?:server|src)\/features\/([^/]+)/.exec(path)?.[1];
const fileOf = (path: string) => /^server\/features\/[^/]+\/([a-z-]+)/.exec(path)?.[1];

describe('the rooms of the project', () => {
  it('are all there to be looked at', () => {
    expect(sources.length).toBeGreaterThan(100);
  });

  it('keep the numeric core free of everything else', () => {
    expect(breaches(within('shared/numeric/'), (imported) => imported.startsWith('shared/numeric/'))).toEqual([]);
  });

  it('keep vocabulary free of imports from other rooms', () => {
    expect(breaches(within('shared/vocabulary/'), (imported) => imported.startsWith('shared/vocabulary/'))).toEqual([]);
  });

  it('let contracts know only words and zod', () => {
    const allowed = (imported: string) =>
      imported === 'zod' || /^shared\/(vocabulary|contracts|numeric|rules|wording)\//.test(imported);
    expect(breaches(within('shared/contracts/'), allowed)).toEqual([]);
  });

  it('let nothing shared know the server, the pages or a package beyond zod', () => {
    expect(breaches(within('shared/'), (imported) => imported === 'zod' || imported.startsWith('shared/'))).toEqual([]);
  });

  it('let only queries and the engines touch tables', () => {
    const files = within('server/features/').filter((file) => !['queries'].includes(fileOf(file.path) ?? ''));
    const allowed = (imported: string) =>
      !imported.startsWith('server/database/tables/') && !imported.startsWith('drizzle-orm');
    expect(breaches(files, allowed)).toEqual([]);
  });

  it('keep requests and Express out of services and queries', () => {
    const files = within('server/features/').filter((file) =>
      ['service', 'queries', 'present'].includes(fileOf(file.path) ?? ''),
    );
    expect(breaches(files, (imported) => imported !== 'express' && imported !== 'express-session')).toEqual([]);
  });

  it('keep queries and tables out of routes', () => {
    const files = within('server/features/').filter((file) => fileOf(file.path) === 'routes');
    expect(
      breaches(files, (imported) => !/\/queries(\/|\.ts)/.test(imported) && !imported.startsWith('server/database/')),
    ).toEqual([]);
  });

  it('let engines never import features', () => {
    const engines = ['http', 'rights', 'audit', 'lineage', 'jobs', 'storage', 'imaging', 'mail', 'sealing'];
    const files = within(...engines.map((engine) => `server/${engine}/`));
    expect(breaches(files, (imported) => !imported.startsWith('server/features/'))).toEqual([]);
  });

  it('let a feature use only features before it, and those by their service', () => {
    const allowed = (imported: string, file: SourceFile) => {
      const other = featureOf(imported);
      const own = featureOf(file.path);
      if (!other || !own || other === own || !imported.startsWith('server/')) return true;
      return featureOrder.indexOf(other) < featureOrder.indexOf(own) && /\/(service|present)(\/|\.ts)/.test(imported);
    };
    expect(breaches(within('server/features/'), allowed)).toEqual([]);
  });

  it('keep the parts of the interface free of features and contracts', () => {
    const allowed = (imported: string) =>
      isPackage(imported) || /^src\/(ui|theme)\//.test(imported) || /^shared\/(vocabulary|wording)\//.test(imported);
    expect(breaches(within('src/ui/'), allowed)).toEqual([]);
  });

  it('keep client features apart from one another and from the server', () => {
    const allowed = (imported: string, file: SourceFile) => {
      if (imported.startsWith('server/')) return false;
      const other = featureOf(imported);
      return !other || other === featureOf(file.path);
    };
    expect(breaches(within('src/features/'), allowed)).toEqual([]);
  });

  it('let no page or part reach into the server', () => {
    expect(breaches(within('src/'), (imported) => !imported.startsWith('server/'))).toEqual([]);
  });

  it('have no import cycles', () => {
    expect(cyclesOf(sources)).toEqual([]);
  });
});

function cyclesOf(files: SourceFile[]): string[] {
  const byPath = new Map(files.map((file) => [file.path, file]));
  const done = new Set<string>();
  const cycles: string[] = [];
  const visit = (path: string, way: string[]) => {
    if (way.includes(path)) cycles.push([...way.slice(way.indexOf(path)), path].join(' → '));
    if (done.has(path) || way.includes(path)) return;
    for (const imported of byPath.get(path)?.imports ?? []) if (byPath.has(imported)) visit(imported, [...way, path]);
    done.add(path);
  };
  for (const file of files) visit(file.path, []);
  return cycles;
}
