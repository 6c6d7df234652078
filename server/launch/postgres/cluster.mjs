import {
  chownSync,
  existsSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs'
import { randomBytes } from 'node:crypto'
import { join } from 'node:path'
import { LaunchError } from '../base/launch-error.mjs'
import { runOrThrow } from '../process/run-command.mjs'
import { findBarringFolder } from './account.mjs'
import { readPrivateJson, writePrivateJson } from './private-file.mjs'
import { cleanEnvironment } from './psql.mjs'

/** The cluster's superuser; the product itself signs in as OWNER, who is none. */
export const SUPERUSER = 'keeper'
export const OWNER = 'foldyard'

/**
 * @typedef {object} Cluster
 * @property {string} folder holds `data`, `log` and `cluster.json`
 * @property {string} bin PostgreSQL's programs
 * @property {import('./account.mjs').Account | undefined} account
 * @property {boolean} isThrowAway made for one run: fast rather than safe, and its owner may create databases
 */

/**
 * @typedef {object} ClusterFile
 * @property {number | undefined} port the one last used
 * @property {string} superuserPassword
 * @property {string} ownerPassword
 */

/** @param {Pick<Cluster, 'folder'>} cluster */
export const dataFolder = (cluster) => join(cluster.folder, 'data')

/** @param {Pick<Cluster, 'folder'>} cluster */
export const logFile = (cluster) => join(cluster.folder, 'log', 'server.log')

/** @param {Pick<Cluster, 'folder'>} cluster */
const clusterFile = (cluster) => join(cluster.folder, 'cluster.json')

/**
 * @param {string} folder
 * @returns {number | undefined} the major version of the cluster there
 */
export const findClusterMajor = (folder) => {
  const file = join(folder, 'data', 'PG_VERSION')
  return existsSync(file) ? Number.parseInt(readFileSync(file, 'utf8'), 10) : undefined
}

/**
 * @param {Cluster} cluster
 * @returns {ClusterFile}
 */
export const readClusterFile = (cluster) => {
  const kept = readPrivateJson(clusterFile(cluster))
  const { port, superuserPassword, ownerPassword } = kept ?? {}
  if (typeof superuserPassword !== 'string' || typeof ownerPassword !== 'string') {
    throw new LaunchError(
      `The passwords of the database in ${cluster.folder} are lost (cluster.json). ` +
        'Restore that file, or delete the folder to begin with an empty database.',
    )
  }
  return { port: typeof port === 'number' ? port : undefined, superuserPassword, ownerPassword }
}

/**
 * @param {Cluster} cluster
 * @param {ClusterFile} content
 */
export const writeClusterFile = (cluster, content) =>
  writePrivateJson(clusterFile(cluster), { ...content })

const newPassword = () => randomBytes(24).toString('base64url')

/**
 * @param {string} folder made if missing, with the server's account as its owner
 * @param {Cluster['account']} account
 */
const makeOwned = (folder, account) => {
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  if (account !== undefined) chownSync(folder, account.uid, account.gid)
}

/**
 * Makes the cluster when there is none. It is built under another name and renamed at the end, so a
 * kill in the middle leaves nothing that looks like a cluster.
 * @param {Cluster} cluster
 * @returns {Promise<boolean>} whether it was made now
 */
export const ensureCluster = async (cluster) => {
  const { folder, bin, account, isThrowAway } = cluster
  if (account !== undefined) {
    const barring = findBarringFolder(folder, account)
    if (barring !== undefined) {
      throw new LaunchError(
        `The account "postgres" may not enter ${barring}. Run: chmod o+x ${barring}`,
      )
    }
  }
  makeOwned(join(folder, 'log'), account)
  for (const name of readdirSync(folder)) {
    if (name.startsWith('data.new-'))
      rmSync(join(folder, name), { recursive: true, force: true, maxRetries: 5 })
  }
  if (existsSync(dataFolder(cluster))) return false
  const draft = join(folder, `data.new-${process.pid}`)
  const passwordFile = join(folder, 'log', 'first-password')
  const content = {
    port: undefined,
    superuserPassword: newPassword(),
    ownerPassword: newPassword(),
  }
  makeOwned(draft, account)
  writeFileSync(passwordFile, content.superuserPassword, { mode: 0o600 })
  if (account !== undefined) chownSync(passwordFile, account.uid, account.gid)
  try {
    await runOrThrow(
      'initdb',
      join(bin, 'initdb'),
      [
        ...[
          '-D',
          draft,
          '-U',
          SUPERUSER,
          '-E',
          'UTF8',
          '--locale=C.UTF-8',
          `--pwfile=${passwordFile}`,
        ],
        ...['--auth-host=scram-sha-256', '--auth-local=scram-sha-256'],
        isThrowAway ? '--no-sync' : '--data-checksums',
      ],
      { cwd: '/', env: cleanEnvironment(), account },
    )
  } finally {
    rmSync(passwordFile, { force: true })
  }
  writeClusterFile(cluster, content)
  renameSync(draft, dataFolder(cluster))
  return true
}
