import { sql } from 'drizzle-orm';
import type { Json } from '../audit/record-act.ts';
import type { Transaction } from '../database/connection.ts';

/**
 * Puts a job down in the transaction of the act that needs it; it runs after the commit, in any process.
 * A job with a `key` replaces one of the same key still waiting; one with `runAt` waits until then.
 */
export async function enqueueJob(
  tx: Transaction,
  name: string,
  payload: Json,
  key?: string,
  runAt?: Date,
): Promise<void> {
  await tx.db.execute(
    sql`select graphile_worker.add_job(${name}, ${JSON.stringify(payload)}::json, job_key := ${key ?? null}::text,
      run_at := ${runAt?.toISOString() ?? null}::timestamptz, max_attempts := 6)`,
  );
}
