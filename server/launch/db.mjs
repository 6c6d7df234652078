import './base/require-node.mjs'
import { LaunchError } from './base/launch-error.mjs'
import { runToEnd } from './process/ending.mjs'
import { sourceDatabaseCommand } from './product/database-command.mjs'
import { useDatabase } from './product/database.mjs'
import { prepare } from './product/prepare.mjs'

const VERBS = ['migrate', 'rollback', 'seed', 'seed-if-empty', 'reset', 'accounts']

await runToEnd(async () => {
  const args = process.argv.slice(2)
  if (!VERBS.includes(args[0] ?? '')) throw new LaunchError(`Give one of: ${VERBS.join(', ')}.`)
  const { url } = await prepare(useDatabase)
  return sourceDatabaseCommand(args, url)
})
