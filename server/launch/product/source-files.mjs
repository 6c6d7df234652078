import { readdirSync, statSync } from 'node:fs'
import { join, relative, sep } from 'node:path'

/**
 * @param {string} path
 * @param {(path: string) => boolean} isSkipped
 * @returns {string[]}
 */
const filesBelow = (path, isSkipped) => {
  const stats = statSync(path, { throwIfNoEntry: false })
  if (stats === undefined || isSkipped(path)) return []
  if (!stats.isDirectory()) return [path]
  return readdirSync(path).flatMap((name) => filesBelow(join(path, name), isSkipped))
}

/**
 * @param {string} root
 * @param {string[]} entries files and folders below `root`; those that do not exist are left out
 * @param {string[]} [skipped] folders below `root` to leave out
 * @returns {string[]} paths from `root` with `/`, sorted by code unit
 */
export const listFiles = (root, entries, skipped = []) => {
  const barred = new Set(skipped.map((entry) => join(root, entry)))
  return entries
    .flatMap((entry) => filesBelow(join(root, entry), (path) => barred.has(path)))
    .map((path) => relative(root, path).split(sep).join('/'))
    .sort()
}
