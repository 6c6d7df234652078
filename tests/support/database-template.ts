import { randomBytes } from 'node:crypto'
import type { TestProject } from 'vitest/node'
import { createDatabase } from '#server/db/knex'
import { migrateToLatest } from '#server/db/migrate'
import { installJobs } from '#server/jobs/job-schema'

declare module 'vitest' {
  interface ProvidedContext {
    /** A migrated database that nobody connects to; test files clone it. */
    databaseTemplate: string
  }
}

const PREFIX = 'foldyard_test'

/** `foldyard_test_<pid of the runner>_…` */
export const testDatabaseName = (runner: number, purpose: string): string =>
  `${PREFIX}_${runner}_${purpose}_${randomBytes(4).toString('hex')}`

export function testServerUrl(): string {
  const url = process.env.TEST_DATABASE_URL
  if (!url) {
    throw new Error('Set TEST_DATABASE_URL to a PostgreSQL server for tests, or run npm test.')
  }
  return url
}

export function urlOfDatabase(name: string): string {
  const url = new URL(testServerUrl())
  url.pathname = `/${name}`
  return url.href
}

/** Runs once before the tests: one migrated template, and the leftovers of dead runners removed. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const server = createDatabase(testServerUrl(), { poolSize: 1 })
  const drop = async (names: readonly string[]) => {
    for (const name of names) await server.raw('drop database if exists ?? with (force)', [name])
  }
  const listTestDatabases = () =>
    server('pg_database').whereLike('datname', `${PREFIX}\\_%`).pluck<string[]>('datname')

  const found = await listTestDatabases()
  await drop(found.filter((name) => !isAlive(runnerOf(name))))

  const template = testDatabaseName(process.pid, 'template')
  await server.raw('create database ??', [template])
  const database = createDatabase(urlOfDatabase(template), { poolSize: 1 })
  await migrateToLatest(database)
  await database.destroy()
  await installJobs(urlOfDatabase(template))
  project.provide('databaseTemplate', template)

  return async () => {
    const left = await listTestDatabases()
    await drop(left.filter((name) => runnerOf(name) === process.pid))
    await server.destroy()
  }
}

/** The process id in the name of a test database. */
export const runnerOf = (name: string): number => Number(name.split('_')[2])

export function isAlive(pid: number): boolean {
  try {
    return process.kill(pid, 0)
  } catch (error) {
    // Somebody else's process cannot be signalled, but it lives.
    return error instanceof Error && 'code' in error && error.code === 'EPERM'
  }
}
