import { join } from 'node:path'
import { run } from '../process/run-command.mjs'

/**
 * Environment for PostgreSQL's programs: nothing of the caller's PG* variables steers them.
 * @param {Record<string, string>} [more]
 */
export const cleanEnvironment = (more = {}) => ({
  PATH: process.env.PATH ?? '/usr/bin:/bin',
  LC_ALL: 'C.UTF-8',
  ...more,
})

/**
 * Runs SQL as the cluster's superuser, through stdin so that no password shows in a process list.
 * @param {{ bin: string, port: number, user: string, password: string, whileEnding?: boolean }} target
 * @param {string} sql
 * @returns {Promise<{ code: number, output: string }>} rows as plain lines
 */
export const psql = ({ bin, port, user, password, whileEnding = false }, sql) =>
  run(
    join(bin, 'psql'),
    [
      '-XAtq',
      '-v',
      'ON_ERROR_STOP=1',
      '-h',
      '127.0.0.1',
      '-p',
      String(port),
      '-U',
      user,
      '-d',
      'postgres',
      '-f',
      '-',
    ],
    {
      cwd: '/',
      env: cleanEnvironment({ PGPASSWORD: password, PGCONNECT_TIMEOUT: '5' }),
      input: sql,
      whileEnding,
    },
  )
