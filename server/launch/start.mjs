import './base/require-node.mjs'
import { LaunchError } from './base/launch-error.mjs'
import { inRoot } from './base/repository.mjs'
import { print, seconds, step } from './base/steps.mjs'
import { runToEnd } from './process/ending.mjs'
import { chooseAddress } from './product/address.mjs'
import { builtDatabaseCommand } from './product/database-command.mjs'
import { useDatabase } from './product/database.mjs'
import { demoAccountLines, parseDemoAccounts } from './product/demo-accounts.mjs'
import { prepare } from './product/prepare.mjs'
import { ensureBuild } from './product/product-build.mjs'
import { sessionSecret } from './product/secrets.mjs'
import { startWebProcess, waitUntilHealthy } from './product/web-process.mjs'

/**
 * @param {string} label
 * @param {string} verb
 * @param {string} url
 */
const databaseStep = (label, verb, url) =>
  step(label, async ({ done }) => {
    const output = await builtDatabaseCommand(verb, url)
    done(output.trim().split('\n').at(-1) || 'done')
  })

/**
 * Everything up to the first answer. It runs under the launch lock, so that of two launchers the
 * second sees the port that the first has taken.
 * @param {string} stateFolder
 */
const startProduct = async (stateFolder) => {
  const { host, port, origin, probe } = await chooseAddress(print)
  const database = await useDatabase(stateFolder)
  await step('Build', ensureBuild)
  await databaseStep('Migrations', 'migrate', database.url)
  if (process.env.SEED_DEMO !== 'false') {
    await databaseStep('Demo data', 'seed-if-empty', database.url)
  }
  const starting = step('Server', async ({ done }) => {
    const web = startWebProcess([inRoot('dist/server/index.js')], {
      // The product is built for use behind TLS; here it is served in the clear to this machine.
      COOKIE_SECURE: 'false',
      LOG_LEVEL: 'warn',
      ...process.env,
      NODE_ENV: 'production',
      HOST: host,
      PORT: String(port),
      DATABASE_URL: database.url,
      SESSION_SECRET: sessionSecret(stateFolder),
    })
    await waitUntilHealthy(web, probe)
    done(`answers on ${host}:${port}`)
    return web
  })
  const [web, accounts] = await Promise.all([
    starting,
    builtDatabaseCommand('accounts', database.url).then(parseDemoAccounts),
  ])
  return { database, web, origin, accounts }
}

const start = async () => {
  const begin = performance.now()
  const { database, web, origin, accounts } = await prepare(startProduct)
  print(`\nFoldyard is ready at ${origin} (${seconds(performance.now() - begin)})`)
  if (accounts.length > 0) print(`\nDemo accounts\n  ${demoAccountLines(accounts).join('\n  ')}`)
  print('\nCtrl-C stops it.')
  const lost = new Promise((_, reject) => database.keepAlive(reject))
  const how = await Promise.race([web.ended, lost])
  throw new LaunchError(`The server ended (${how}).`)
}

await runToEnd(start, { isServer: true })
