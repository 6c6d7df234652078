import { existsSync, mkdirSync, readdirSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { atEnd } from '../process/ending.mjs'
import { formatHolder, isAlive, ownHolder, parseHolder } from '../process/identity.mjs'
import { serverAccount } from './account.mjs'
import { ensureCluster } from './cluster.mjs'
import { ensurePrograms } from './programs.mjs'
import { ensureDatabase, ensureServer, stopServer } from './server.mjs'

/** @typedef {import('./cluster.mjs').Cluster} Cluster */

/** @param {Cluster} cluster */
const remove = async (cluster) => {
  await stopServer(cluster, 'immediate')
  rmSync(cluster.folder, { recursive: true, force: true, maxRetries: 5 })
}

/**
 * Removes the clusters of runs that were killed.
 * @param {string} parent
 * @param {Omit<Cluster, 'folder'>} base
 */
const removeLeftovers = async (parent, base) => {
  if (!existsSync(parent)) return
  for (const name of readdirSync(parent)) {
    const holder = parseHolder(name)
    if (holder === undefined || !isAlive(holder))
      await remove({ ...base, folder: join(parent, name) })
  }
}

/**
 * A cluster for one run, deleted at its end.
 * @param {string} stateFolder
 * @param {{ note: (line: string) => void, done: (line: string) => void }} report
 * @returns {Promise<string>} the address of a database whose owner may create further ones
 */
export const useThrowAwayCluster = async (stateFolder, { note, done }) => {
  const { bin } = await ensurePrograms(undefined, note)
  const base = { bin, account: serverAccount(), isThrowAway: true }
  const parent = join(stateFolder, 'throw-away')
  await removeLeftovers(parent, base)
  /** @type {Cluster} */
  const cluster = { ...base, folder: join(parent, formatHolder(ownHolder())) }
  mkdirSync(cluster.folder, { recursive: true })
  atEnd(() => remove(cluster))
  await ensureCluster(cluster)
  const { port } = await ensureServer(cluster)
  const url = await ensureDatabase(cluster, port)
  done(`throw-away cluster on 127.0.0.1:${port}`)
  return url
}
