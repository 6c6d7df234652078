import { readFileSync, statSync } from 'node:fs'
import { dirname } from 'node:path'
import { LaunchError } from '../base/launch-error.mjs'

/** @typedef {{ uid: number, gid: number }} Account */

/**
 * @param {string} passwd the text of /etc/passwd
 * @param {string} name
 * @returns {Account | undefined}
 */
export const parseAccount = (passwd, name) => {
  const line = passwd.split('\n').find((entry) => entry.startsWith(`${name}:`))
  const [, , uid, gid] = line?.split(':') ?? []
  return uid && gid ? { uid: Number(uid), gid: Number(gid) } : undefined
}

/**
 * PostgreSQL refuses to run as root: there it runs as Debian's `postgres`, otherwise as whoever
 * starts it.
 * @returns {Account | undefined} undefined when no switch is needed
 */
export const serverAccount = () => {
  if (process.getuid?.() !== 0) return undefined
  const account = parseAccount(readFileSync('/etc/passwd', 'utf8'), 'postgres')
  if (account === undefined) {
    throw new LaunchError(
      'PostgreSQL does not run as root and this system has no account "postgres". Start as an ordinary user.',
    )
  }
  return account
}

/**
 * @param {{ mode: number, uid: number, gid: number }} stats of a folder
 * @param {Account} account
 */
export const mayEnter = (stats, account) => {
  const bit = stats.uid === account.uid ? 0o100 : stats.gid === account.gid ? 0o010 : 0o001
  return (stats.mode & bit) !== 0
}

/**
 * @param {string} folder
 * @param {Account} account
 * @returns {string | undefined} the outermost folder on the way to it that bars the account
 */
export const findBarringFolder = (folder, account) => {
  const parent = dirname(folder)
  const above = parent === folder ? undefined : findBarringFolder(parent, account)
  return above ?? (mayEnter(statSync(folder), account) ? undefined : folder)
}
