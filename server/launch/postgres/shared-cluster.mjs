import { join } from 'node:path'
import { LaunchError } from '../base/launch-error.mjs'
import { atEnd } from '../process/ending.mjs'
import { addLease, dropLease } from '../process/leases.mjs'
import { withLock } from '../process/lock.mjs'
import { serverAccount } from './account.mjs'
import { dataFolder, ensureCluster, findClusterMajor } from './cluster.mjs'
import { findPostmaster } from './postmaster.mjs'
import { ensurePrograms } from './programs.mjs'
import { ensureDatabase, ensureServer, stopServer } from './server.mjs'

/** @typedef {import('./cluster.mjs').Cluster} Cluster */

/** @param {string} folder */
const lockOf = (folder) => join(folder, 'cluster.lock')
/** @param {string} folder */
const usersOf = (folder) => join(folder, 'users')

/**
 * The clone's lasting cluster, kept in its state folder and shared by everything started from the
 * clone: the last user to leave stops it.
 * @param {string} folder the state folder
 * @param {{ note: (line: string) => void, done: (line: string) => void }} report
 * @returns {Promise<{ cluster: Cluster, url: string }>}
 */
export const useSharedCluster = async (folder, { note, done }) => {
  const programs = await ensurePrograms(findClusterMajor(folder), note)
  /** @type {Cluster} */
  const cluster = { folder, bin: programs.bin, account: serverAccount(), isThrowAway: false }
  atEnd(() =>
    withLock(lockOf(folder), undefined, async () => {
      if (dropLease(usersOf(folder)) === 0) await stopServer(cluster)
    }),
  )
  return withLock(lockOf(folder), undefined, async () => {
    addLease(usersOf(folder))
    const isNew = await ensureCluster(cluster)
    const { port, isReused } = await ensureServer(cluster)
    const url = await ensureDatabase(cluster, port)
    const how = isNew ? 'new cluster' : isReused ? 'already running' : 'started'
    done(`${how} on 127.0.0.1:${port}, data in ${folder}`)
    return { cluster, url }
  })
}

/**
 * Starts the server again whenever it dies, so that the product's next query finds it.
 * @param {Cluster} cluster
 * @param {string} url where the product looks for it
 * @param {(line: string) => void} report
 * @param {(error: unknown) => void} onLoss called when it cannot be had back at that address
 */
export const keepServerAlive = (cluster, url, report, onLoss) => {
  let isBusy = false
  const restore = async () => {
    await withLock(lockOf(cluster.folder), undefined, async () => {
      const { port, isReused } = await ensureServer(cluster)
      if (String(port) !== new URL(url).port) {
        throw new LaunchError('The database server died and its port was taken by another program.')
      }
      if (!isReused) report('The database server had died; it runs again.')
    })
  }
  const timer = setInterval(() => {
    if (isBusy || findPostmaster(dataFolder(cluster)) !== undefined) return
    isBusy = true
    restore()
      .catch(onLoss)
      .finally(() => {
        isBusy = false
      })
  }, 1000)
  atEnd(() => clearInterval(timer))
}
