import { execFile, fork, type ChildProcess } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { once } from 'node:events'
import { existsSync } from 'node:fs'
import { createInterface } from 'node:readline'
import type { Readable } from 'node:stream'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { z } from 'zod'
import { createDatabase } from '#server/db/knex'
import { isAlive, runnerOf, testServerUrl, urlOfDatabase } from './database-template'

const PREFIX = 'foldyard_e2e'
/** pino's number for errors. */
const ERROR_LEVEL = 50
const STOP_TIMEOUT = 10_000

const inRoot = (path: string): string => fileURLToPath(new URL(`../../${path}`, import.meta.url))
const SERVER = inRoot('dist/server/index.js')
const DATABASE_COMMAND = inRoot('dist/server/cli.js')
const CLIENT = inRoot('dist/client')

const logLineSchema = z.looseObject({ level: z.number() })
const listeningSchema = z.looseObject({ msg: z.literal('listening'), url: z.url() })

export interface ProductDatabase {
  readonly url: string
  readonly drop: () => Promise<void>
}

export interface Product {
  readonly url: string
  readonly stop: () => Promise<void>
}

function requireBuild(): void {
  for (const path of [SERVER, DATABASE_COMMAND, `${CLIENT}/index.html`]) {
    if (!existsSync(path)) throw new Error(`${path} is missing: run npm run build first.`)
  }
}

/**
 * A database with the demo shop, made by the built database command and named by this process; those
 * of processes that died are removed.
 */
export async function createProductDatabase(): Promise<ProductDatabase> {
  requireBuild()
  const admin = createDatabase(testServerUrl(), { poolSize: 1 })
  const drop = (name: string) => admin.raw('drop database if exists ?? with (force)', [name])
  const found = await admin('pg_database')
    .whereLike('datname', `${PREFIX}\\_%`)
    .pluck<string[]>('datname')
  for (const name of found.filter((each) => !isAlive(runnerOf(each)))) await drop(name)

  const name = `${PREFIX}_${process.pid}_${randomBytes(4).toString('hex')}`
  await admin.raw('create database ??', [name])
  const url = urlOfDatabase(name)
  const command = promisify(execFile)
  for (const verb of ['migrate', 'seed']) {
    await command(process.execPath, [DATABASE_COMMAND, verb], { env: environment(url) })
  }
  return {
    url,
    drop: async () => {
      await drop(name)
      await admin.destroy()
    },
  }
}

const environment = (databaseUrl: string): NodeJS.ProcessEnv => ({
  ...process.env,
  NODE_ENV: 'production',
  DATABASE_URL: databaseUrl,
  HOST: '127.0.0.1',
  PORT: '0',
  SESSION_SECRET: randomBytes(32).toString('hex'),
  COOKIE_SECURE: 'false',
  TRUST_PROXY: '0',
  LOG_LEVEL: 'info',
  CLIENT_DIR: CLIENT,
  SHOP_TIME_ZONE: 'America/Chicago',
})

/**
 * The built server on a port of its own, with an IPC channel, whose end tells it that the tests are
 * gone.
 */
export async function startProduct(databaseUrl: string): Promise<Product> {
  requireBuild()
  const child = fork(SERVER, {
    execArgv: [],
    env: environment(databaseUrl),
    stdio: ['ignore', 'pipe', 'inherit', 'ipc'],
  })
  const ended = once(child, 'exit')
  const stop = async () => {
    if (hasEnded(child)) return
    child.kill('SIGTERM')
    const timer = setTimeout(() => child.kill('SIGKILL'), STOP_TIMEOUT)
    await ended
    clearTimeout(timer)
  }
  if (!child.stdout) throw new Error('The log of the server cannot be read.')
  try {
    const url = await Promise.race([
      readAddress(child.stdout),
      ended.then(([code]) => {
        throw new Error(`The server ended before it listened (exit ${String(code)}).`)
      }),
    ])
    const health = await fetch(`${url}/api/health`)
    if (health.status !== 200) throw new Error(`/api/health answered ${health.status}.`)
    return { url, stop }
  } catch (error) {
    await stop()
    throw error
  }
}

const hasEnded = (child: ChildProcess): boolean =>
  child.exitCode !== null || child.signalCode !== null

/** The address from the server's log; its errors are shown as long as it runs. */
function readAddress(log: Readable): Promise<string> {
  return new Promise((resolve) => {
    createInterface({ input: log }).on('line', (text) => {
      const line: unknown = JSON.parse(text)
      const listening = listeningSchema.safeParse(line)
      if (listening.success) resolve(listening.data.url)
      if (logLineSchema.parse(line).level >= ERROR_LEVEL) process.stderr.write(`${text}\n`)
    })
  })
}
