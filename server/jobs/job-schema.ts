import { runMigrations } from 'graphile-worker'
import { pino } from 'pino'
import type { Db } from '#server/db/knex'
import { workerLogger } from '#server/jobs/worker-logger'

/**
 * Makes the queue's own tables, after ours. From then on jobs can be left, whether or not a worker
 * runs. Does nothing where they are there already.
 */
export async function installJobs(databaseUrl: string): Promise<void> {
  await runMigrations({
    connectionString: databaseUrl,
    maxPoolSize: 2,
    logger: workerLogger(pino({ level: 'silent' })),
  })
}

/** Takes the queue away with what waits in it. */
export async function removeJobs(db: Db): Promise<void> {
  await db.raw('drop schema if exists graphile_worker cascade')
}
