import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';

export type SourceFile = { path: string; text: string; imports: string[] };

const importPattern =
  /(?:^|\n)\s*(?:import|export)\s[^;'"]*?from\s*['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)|(?:^|\n)\s*import\s*['"]([^'"]+)['"]/g;

/** Every source file of the rooms, with what it imports as paths from the top (packages stay as they are named). */
export function readSources(rooms: readonly string[] = ['shared', 'server', 'src']): SourceFile[] {
  return rooms
    .flatMap((room) => readdirSync(room, { recursive: true, encoding: 'utf8' }).map((path) => join(room, path)))
    .filter((path) => /\.tsx?$/.test(path))
    .map((path) => {
      const text = readFileSync(path, 'utf8');
      const imports = [...text.matchAll(importPattern)].map((found) =>
        resolveImport(path, found[1] ?? found[2] ?? found[3]),
      );
      return { path, text, imports };
    });
}

export function isTest(path: string): boolean {
  return /\.test\.tsx?$/.test(path);
}

function resolveImport(from: string, to: string): string {
  if (to.startsWith('#')) return to.slice(1);
  if (to.startsWith('.')) return normalize(join(dirname(from), to));
  return to;
}
