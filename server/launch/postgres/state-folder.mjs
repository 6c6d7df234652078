import { createHash } from 'node:crypto'
import { accessSync, constants, existsSync, mkdirSync, statSync } from 'node:fs'
import { homedir, tmpdir } from 'node:os'
import { basename, join } from 'node:path'
import { LaunchError } from '../base/launch-error.mjs'
import { inRoot, ROOT } from '../base/repository.mjs'

/**
 * @param {string} root the repository's real path
 * @returns {string} tells clones apart and still reads as the clone's own name
 */
export const cloneName = (root) => {
  const hash = createHash('sha256').update(root).digest('hex').slice(0, 8)
  return `${basename(root).replace(/[^A-Za-z0-9._-]/g, '_') || 'clone'}-${hash}`
}

/**
 * Outside the repository first: `git clean` cannot take a running database away, and the server's
 * account need not enter somebody's home.
 * @param {{ uid: number, home: string, stateHome: string | undefined, temporary: string }} person
 * @returns {string[]} in order of preference
 */
export const stateFolderCandidates = ({ uid, home, stateHome, temporary }) => [
  uid === 0 ? '/var/lib/foldyard' : join(stateHome || join(home, '.local/state'), 'foldyard'),
  inRoot('.local/state'),
  join(temporary, `foldyard-${uid}`),
]

/**
 * @param {string} folder
 * @param {number} uid
 * @returns {boolean} whether it exists now, is this account's own and can be written
 */
const makeUsable = (folder, uid) => {
  try {
    // Root's is entered by the server's account; anyone else keeps it to himself.
    mkdirSync(folder, { recursive: true, mode: uid === 0 ? 0o755 : 0o700 })
    accessSync(folder, constants.W_OK | constants.X_OK)
    return statSync(folder).uid === uid
  } catch {
    return false
  }
}

/** @returns {string} the folder of this clone's database and secrets, made when missing */
export const getStateFolder = () => {
  const uid = process.getuid?.() ?? 0
  const name = cloneName(ROOT)
  const folders = stateFolderCandidates({
    uid,
    home: homedir(),
    stateHome: process.env.XDG_STATE_HOME,
    temporary: tmpdir(),
  }).map((folder) => join(folder, name))
  const known = folders.find(
    (folder) => existsSync(join(folder, 'cluster.json')) && makeUsable(folder, uid),
  )
  const folder = known ?? folders.find((candidate) => makeUsable(candidate, uid))
  if (folder === undefined) {
    throw new LaunchError(
      `No place for the database: none of these can be written.\n  ${folders.join('\n  ')}`,
    )
  }
  return folder
}
