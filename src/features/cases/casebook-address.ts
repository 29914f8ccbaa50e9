import { CasebookQuery } from '#shared/contracts/casebook.ts';

const defaults = CasebookQuery.parse({});

/** The query that stands in an address. What cannot be read there counts as not said. */
export function readAddress(search: URLSearchParams): CasebookQuery {
  const said: Record<string, string> = {};
  for (const [name, value] of search) {
    const alone = CasebookQuery.safeParse({ [name]: value });
    if (name in CasebookQuery.shape && alone.success) said[name] = value;
  }
  return CasebookQuery.parse(said);
}

/** A query as an address: only what differs from the Casebook as it opens. */
export function writeAddress(query: Partial<CasebookQuery>): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries({ ...defaults, ...query })) {
    const usual: unknown = Reflect.get(defaults, name);
    if (value !== undefined && value !== usual) search.set(name, String(value));
  }
  return search.toString();
}
