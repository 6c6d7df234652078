import type { Knex } from 'knex'
import { pino, type DestinationStream } from 'pino'
import { inject } from 'vitest'
import { systemClock, type Clock } from '#server/adapters/clock'
import { readConfig } from '#server/config'
import { createDatabase } from '#server/db/knex'
import type { JobsDeps, RunningJobs } from '#server/jobs/job'
import { sourceWorker } from '#server/planning/source-worker'
import { startPlanning, type Planning, type PlanningDeps } from '#server/planning/start-planning'
import { startServer, type RunningServer } from '#server/running-server'
import type { Role } from '#shared/access/permissions'
import { ApiAgent } from './api-agent'
import { runnerOf, testDatabaseName, testServerUrl, urlOfDatabase } from './database-template'
import { runDueJobs } from './run-jobs'
import { createFactories, PASSWORD, type Factories, type TestPerson } from './factories'

export interface ApiOptions {
  readonly clock?: Clock
  /** Where log lines go; nowhere by default. */
  readonly log?: DestinationStream
  /** Settings as the environment would give them. */
  readonly environment?: Record<string, string>
  /** Where plans come from; threads from the sources by default. */
  readonly planning?: (deps: PlanningDeps) => Planning
  /** Runs jobs as they come; by default they wait for `runJobs`. */
  readonly jobs?: (deps: JobsDeps) => Promise<RunningJobs>
  /** Shares the database of another one, as a second process behind a balancer does. */
  readonly sharing?: Api
}

export interface Api {
  readonly url: string
  readonly databaseUrl: string
  readonly db: Knex
  readonly server: RunningServer
  readonly make: Factories
  /** A browser in which nobody is signed in yet. */
  readonly newAgent: () => ApiAgent
  /** A new person of this role, signed in; or the person given. */
  readonly signInAs: (who: Role | TestPerson) => Promise<ApiAgent>
  /** Runs the jobs that are due by now, mails among them. */
  readonly runJobs: () => Promise<void>
  readonly close: () => Promise<void>
}

/** The whole server on a port of its own and a fresh clone of the migrated database. */
export async function startApi(options: ApiOptions = {}): Promise<Api> {
  const database = options.sharing
    ? { url: options.sharing.databaseUrl, drop: () => Promise.resolve() }
    : await cloneTemplate()
  let left: JobsDeps | undefined
  const server = await startServer({
    config: readConfig({
      NODE_ENV: 'test',
      DATABASE_URL: database.url,
      PORT: '0',
      ...options.environment,
    }),
    logger: options.log ? pino({ level: 'info' }, options.log) : pino({ level: 'silent' }),
    clock: options.clock ?? systemClock,
    client: () => Promise.resolve((_request, response) => void response.sendStatus(404)),
    contentSecurityPolicy: true,
    planning: options.planning ?? ((deps) => startPlanning({ program: sourceWorker }, deps)),
    jobs: async (deps) => {
      left = deps
      return (await options.jobs?.(deps)) ?? { close: () => Promise.resolve() }
    },
  })
  const make = createFactories(server.db)
  const newAgent = () => new ApiAgent(server.url)

  const signInAs = async (who: Role | TestPerson) => {
    const person = typeof who === 'string' ? await make.person(who) : who
    const agent = newAgent()
    const { status } = await agent.signIn(person.email, PASSWORD)
    if (status !== 200) throw new Error(`${person.email} could not sign in: ${status}.`)
    return agent
  }

  const runJobs = async () => {
    if (!left) throw new Error('The server was not started.')
    await runDueJobs(left)
  }

  const close = async () => {
    await server.close()
    await database.drop()
  }
  const { url, db } = server
  return { url, databaseUrl: database.url, db, server, make, newAgent, signInAs, runJobs, close }
}

async function cloneTemplate() {
  const admin = createDatabase(testServerUrl(), { poolSize: 1 })
  const template = inject('databaseTemplate')
  const name = testDatabaseName(runnerOf(template), 'file')
  await admin.raw('create database ?? template ?? strategy file_copy', [name, template])
  return {
    url: urlOfDatabase(name),
    drop: async () => {
      await admin.raw('drop database if exists ?? with (force)', [name])
      await admin.destroy()
    },
  }
}
