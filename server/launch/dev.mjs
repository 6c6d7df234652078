import './base/require-node.mjs'
import { LaunchError } from './base/launch-error.mjs'
import { print } from './base/steps.mjs'
import { runToEnd } from './process/ending.mjs'
import { chooseAddress } from './product/address.mjs'
import { sourceDatabaseCommand } from './product/database-command.mjs'
import { useDatabase } from './product/database.mjs'
import { prepare } from './product/prepare.mjs'
import { sessionSecret } from './product/secrets.mjs'
import { watchSources } from './product/watch-sources.mjs'
import { startWebProcess } from './product/web-process.mjs'

/** What the server runs; the client's own files are followed by Vite. */
const SERVER_SOURCES = ['server', 'shared', 'migrations', 'seeds']

/** @param {string} stateFolder */
const startDevelopment = async (stateFolder) => {
  const { host, port, origin } = await chooseAddress(print)
  const database = await useDatabase(stateFolder)
  for (const verb of ['migrate', 'seed-if-empty']) {
    const code = await sourceDatabaseCommand([verb], database.url)
    if (code !== 0) throw new LaunchError(`The database command "${verb}" failed (exit ${code}).`)
  }
  const env = {
    COOKIE_SECURE: 'false',
    ...process.env,
    NODE_ENV: 'development',
    HOST: host,
    PORT: String(port),
    DATABASE_URL: database.url,
    SESSION_SECRET: sessionSecret(stateFolder),
  }
  const start = () => {
    const web = startWebProcess(['--import', 'tsx', 'server/dev.ts'], env)
    void web.ended.then((how) => print(`The server ended (${how}).`))
    return web
  }
  let web = start()
  let restart = Promise.resolve()
  watchSources(SERVER_SOURCES, () => {
    restart = restart.then(async () => {
      await web.stop()
      print('Sources changed: starting the server again.')
      web = start()
    })
  })
  print(`Development server at ${origin}; Ctrl-C stops it.`)
  return database
}

await runToEnd(
  async () => {
    const database = await prepare(startDevelopment)
    return new Promise((_, reject) => database.keepAlive(reject))
  },
  { isServer: true },
)
