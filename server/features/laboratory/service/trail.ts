import type { TrailPage, TrailQuery } from '#shared/contracts/laboratory.ts';
import type { Context } from '../../../http/context.ts';
import { presentEntry, wordsOfAct } from '../present.ts';
import { listActsDone, listTrail, namesOf } from '../queries.ts';

const entriesOnAPage = 50;

/** One page of the audit trail, newest first. */
export async function readTrail({ reader }: Pick<Context, 'reader'>, asked: TrailQuery): Promise<TrailPage> {
  const rows = await listTrail(reader, asked, entriesOnAPage + 1);
  const shown = rows.slice(0, entriesOnAPage);
  const objects = shown.flatMap(({ entry }) => (entry.chain === 'laboratory' && entry.objectId ? entry.objectId : []));
  const names = await namesOf(reader, objects.filter(isUuid));
  const acts = (await listActsDone(reader)).map((act) => ({ act, words: wordsOfAct(act) }));
  return {
    entries: shown.map(({ entry, caseNumber }) => presentEntry(entry, caseNumber, names)),
    older: rows.length > shown.length ? (shown.at(-1)?.entry.id ?? null) : null,
    acts: acts.sort((one, other) => one.words.localeCompare(other.words)),
  };
}

const isUuid = (word: string) => /^[0-9a-f-]{36}$/i.test(word);
