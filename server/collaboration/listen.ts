import pg from 'pg';
import type { Logger } from 'pino';

const againAfterMs = 500;

export type Listening = {
  /** Tells the other processes. Lost quietly while the connection is down: whoever comes back asks afresh. */
  notify(channel: string, text: string): Promise<unknown>;
  stop(): Promise<void>;
};

/**
 * One connection that hears the notifications of the database and is opened again whenever it is lost.
 * `onOpen` is told each time it has been opened, since news may have gone by meanwhile.
 */
export async function listen(
  url: string,
  hears: Readonly<Record<string, (payload: string) => void>>,
  options: { onOpen: () => void; log: Logger },
): Promise<Listening> {
  let client: pg.Client | null = null;
  let stopped = false;
  let again: NodeJS.Timeout | undefined;

  const lost = () => {
    if (!client) return;
    client.removeAllListeners();
    client.on('error', () => undefined);
    client = null;
    if (!stopped) again = setTimeout(() => void open(), againAfterMs);
  };
  const open = async () => {
    const opening = new pg.Client({ connectionString: url, keepAlive: true, application_name: 'hacklebook news' });
    client = opening;
    opening.on('error', lost);
    opening.on('end', lost);
    opening.on('notification', ({ channel, payload }) => hears[channel]?.(payload ?? ''));
    try {
      await opening.connect();
      for (const channel of Object.keys(hears)) await opening.query(`listen ${pg.escapeIdentifier(channel)}`);
      options.onOpen();
    } catch (error) {
      options.log.warn({ err: error }, 'the news of the database is not heard; trying again');
      await opening.end().catch(() => undefined);
      lost();
    }
  };
  await open();
  // one after another: a connection answers one query at a time
  let last: Promise<unknown> = Promise.resolve();
  return {
    notify: (channel, text) => {
      last = last.then(() => client?.query('select pg_notify($1, $2)', [channel, text]).catch(() => undefined));
      return last;
    },
    stop: async () => {
      stopped = true;
      clearTimeout(again);
      await client?.end().catch(() => undefined);
    },
  };
}
