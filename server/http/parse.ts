import type { z } from 'zod';
import { Problem } from './problem.ts';

/** Reads a request's part by its contract. @throws Problem not-valid, naming the first wrong field and all of them. */
export function parse<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const read = schema.safeParse(value);
  if (read.success) return read.data;
  const fields: Record<string, string> = {};
  for (const issue of read.error.issues) fields[issue.path.join('.') || 'request'] ??= issue.message;
  const [first] = Object.entries(fields);
  throw new Problem('not-valid', first ? `${first[0]}: ${first[1]}` : 'The request could not be read.', {
    field: first?.[0],
    fields,
  });
}
