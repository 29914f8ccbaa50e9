import { EventEmitter } from 'node:events';
import { run, type WorkerEvents } from 'graphile-worker';
import type { Logger } from 'pino';
import { Logger as WorkerLogger } from 'graphile-worker';
import type { Database } from '../database/connection.ts';
import type { VisitorContext } from '../http/context.ts';
import { watchOrphanedJobs } from './orphaned-jobs.ts';

/** A job's work: given the server's own context and what was put down with the job. It may be run a second time. */
export type Task = (context: VisitorContext, payload: unknown) => Promise<void>;
export type TaskTable = Readonly<Record<string, Task>>;

/** Runs jobs from the database until stopped; several processes may run at once, and one that dies loses no job. */
export async function runJobs(database: Database, context: VisitorContext, tasks: TaskTable, log: Logger) {
  const orphanedJobs = watchOrphanedJobs(database, log);
  const events: WorkerEvents = new EventEmitter();
  events.on('pool:create', ({ workerPool }) => void orphanedJobs.standFor(workerPool.id));
  const runner = await run({
    pgPool: database.pool,
    concurrency: 2,
    noHandleSignals: true,
    pollInterval: 2000,
    events,
    logger: new WorkerLogger(() => (level, message) => {
      if (level === 'error' || level === 'warning') log.warn({ level }, message);
    }),
    taskList: Object.fromEntries(
      Object.entries(tasks).map(([name, task]) => [name, (payload: unknown) => task(context, payload)]),
    ),
  });
  void orphanedJobs.look();
  return {
    stop: async () => {
      await runner.stop();
      await orphanedJobs.stop();
    },
  };
}
