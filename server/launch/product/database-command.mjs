import { inRoot } from '../base/repository.mjs'
import { run, runOrThrow } from '../process/run-command.mjs'

/**
 * Runs a verb of the built database command.
 * @param {string} verb
 * @param {string} url
 * @returns {Promise<string>} what it printed
 */
export const builtDatabaseCommand = (verb, url) =>
  runOrThrow(
    `The database command "${verb}"`,
    process.execPath,
    [inRoot('dist/server/cli.js'), verb],
    {
      env: { ...process.env, NODE_ENV: 'production', DATABASE_URL: url },
    },
  )

/**
 * Runs a verb straight from the sources, showing what it prints.
 * @param {string[]} args the verb and what follows it
 * @param {string} url
 * @returns {Promise<number>} its exit code
 */
export const sourceDatabaseCommand = async (args, url) => {
  const { code } = await run(process.execPath, ['--import', 'tsx', 'server/db/cli.ts', ...args], {
    env: { ...process.env, DATABASE_URL: url },
    inherit: true,
  })
  return code
}
