import { readFileSync } from 'node:fs';
import { z } from 'zod';
import { ReckoningWanted, type Reckoning } from '#shared/contracts/reckonings.ts';
import { reckonListed } from '#shared/rules/reckon-listed.ts';

export type FileReckoned =
  | { readonly kind: 'reckoned'; readonly reckonings: readonly Reckoning[] }
  | { readonly kind: 'unreadable'; readonly reason: string };

/** Reckons the list of methods in a JSON file, in its order, as `npm run reckon` prints it. Keeps nothing. */
export function reckonFile(path: string): FileReckoned {
  const list = listIn(readFileSync(path, 'utf8'));
  if (list === undefined) return unreadable(`${path} is not JSON.`);
  const read = z.array(ReckoningWanted).safeParse(list);
  if (!read.success) {
    const [issue] = read.error.issues;
    return unreadable(`${path} is not a list of { id, method, inputs }: ${issue?.path.join('.')}: ${issue?.message}`);
  }
  return { kind: 'reckoned', reckonings: read.data.map((wanted) => reckonListed(wanted)) };
}

function unreadable(reason: string): FileReckoned {
  return { kind: 'unreadable', reason };
}

function listIn(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
