import type { Logger } from 'pino';
import type pg from 'pg';
import type { Database } from '../database/connection.ts';

// A worker takes its lock right after it starts; jobs younger than this may be of one that is about to.
const youngestSeconds = 3;
const lookEveryMs = 5_000;

const lockKey = `hashtextextended('job worker ' || id, 0)`;

/**
 * Gives the jobs of a process that was killed to the living. The queue itself would wait four hours, since it can't know.
 * Every process holds, on one connection, a session lock named for its own workers; PostgreSQL lets it go when the process
 * is no more. Whose lock can be taken is dead, and its jobs are set free by the queue's own `force_unlock_workers`.
 */
export function watchOrphanedJobs(database: Database, log: Logger) {
  const own = new Set<string>();
  let client: pg.PoolClient | null = null;
  let stopped = false;

  const connection = async () => {
    if (client) return client;
    const fresh = await database.pool.connect();
    fresh.once('error', () => {
      // Once given back it is the pool's, and its end no longer concerns the watch.
      if (client !== fresh) return;
      client = null;
      fresh.release(true);
    });
    client = fresh;
    for (const id of own) await fresh.query(`select pg_advisory_lock(${lockKey}) from (values ($1)) as own (id)`, [id]);
    return fresh;
  };

  const standFor = async (workerId: string) => {
    const lost = client === null;
    own.add(workerId);
    const held = await connection();
    if (!lost) await held.query(`select pg_advisory_lock(${lockKey}) from (values ($1)) as own (id)`, [workerId]);
  };

  const look = async () => {
    const held = await connection();
    const { rows } = await held.query<{ id: string }>(
      `with suspects as (
         select distinct locked_by as id from graphile_worker.jobs
         where locked_by is not null and locked_at < now() - make_interval(secs => $1) and locked_by <> all($2::text[])
       )
       select id from suspects where pg_try_advisory_lock(${lockKey})`,
      [youngestSeconds, [...own]],
    );
    for (const { id } of rows) {
      await held.query('select graphile_worker.force_unlock_workers(array[$1])', [id]);
      await held.query(`select pg_advisory_unlock(${lockKey}) from (values ($1)) as dead (id)`, [id]);
      log.warn({ worker: id }, 'jobs of a process that is no more were set free');
    }
  };

  const inTurn = (work: () => Promise<void>) => {
    turn = turn.then(work).catch((error: unknown) => {
      if (!stopped) log.warn({ err: error }, 'looking for dead workers failed; it is tried again');
    });
    return turn;
  };
  let turn = Promise.resolve();
  const timer = setInterval(() => void inTurn(look), lookEveryMs);

  return {
    standFor: (workerId: string) => inTurn(() => standFor(workerId)),
    look: () => inTurn(look),
    stop: async () => {
      stopped = true;
      clearInterval(timer);
      await turn;
      const held = client;
      client = null;
      held?.release(true);
    },
  };
}
