/**
 * What the checks read of a lock entry, in package-lock.json and in npm's own record of what it
 * installed (node_modules/.package-lock.json).
 * @typedef {{ version?: string, integrity?: string, link?: boolean, optional?: boolean,
 *   devOptional?: boolean, extraneous?: boolean, dependencies?: Record<string, string>,
 *   devDependencies?: Record<string, string>, optionalDependencies?: Record<string, string> }} LockEntry
 * @typedef {{ packages: Record<string, LockEntry> }} Lock
 */

/** @type {('dependencies' | 'devDependencies' | 'optionalDependencies')[]} */
const KINDS = ['dependencies', 'devDependencies', 'optionalDependencies']

/**
 * @param {LockEntry} manifest package.json
 * @param {Lock} lock package-lock.json
 * @returns {string | undefined} the first package that the two name differently
 */
export const findLockMismatch = (manifest, lock) => {
  const locked = lock.packages[''] ?? {}
  for (const kind of KINDS) {
    const wanted = manifest[kind] ?? {}
    const known = locked[kind] ?? {}
    for (const name of new Set([...Object.keys(wanted), ...Object.keys(known)])) {
      if (wanted[name] !== known[name]) return name
    }
  }
  return undefined
}

/**
 * Compares what should be installed with what is. npm writes its record last, so an interrupted
 * installation has none or an old one.
 * @param {Lock} lock package-lock.json
 * @param {Lock} installed node_modules/.package-lock.json
 * @param {(path: string) => boolean} isThere whether the package's own package.json exists
 * @returns {string | undefined} the first package that is absent, of another version or damaged;
 *   one that is optional (for another system) or that nothing needs (`extraneous`, which `npm ci`
 *   leaves out) may be absent
 */
export const findStalePackage = (lock, installed, isThere) => {
  for (const [path, wanted] of Object.entries(lock.packages)) {
    if (path === '') continue
    const found = installed.packages[path]
    if (found === undefined) {
      if (wanted.optional || wanted.devOptional || wanted.extraneous) continue
      return path
    }
    if (found.version !== wanted.version || found.integrity !== wanted.integrity) return path
    if (!isThere(path)) return path
  }
  return Object.keys(installed.packages).find((path) => lock.packages[path] === undefined)
}
