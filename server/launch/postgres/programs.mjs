import { existsSync, readdirSync, realpathSync } from 'node:fs'
import { delimiter, dirname, join } from 'node:path'
import { installDebianPackages } from '../packages/debian-packages.mjs'

const NEEDED = ['initdb', 'pg_ctl', 'postgres', 'psql']
const DEBIAN_FOLDER = '/usr/lib/postgresql'
const OTHER_WAY =
  'Or set DATABASE_URL to the address of an empty database on a server that you run.'

/** @typedef {{ bin: string, major: number | undefined }} Programs `major` when the path tells it */

/** @param {string} bin */
const isComplete = (bin) => NEEDED.every((name) => existsSync(join(bin, name)))

/**
 * @param {string} folder holding one folder a major version
 * @returns {number[]} newest first
 */
const majorsIn = (folder) =>
  existsSync(folder)
    ? readdirSync(folder)
        .filter((name) => /^\d+$/.test(name))
        .map(Number)
        .sort((a, b) => b - a)
    : []

/** @param {string} path the PATH variable */
const foldersInPath = (path) =>
  path
    .split(delimiter)
    .filter((folder) => existsSync(join(folder, 'pg_ctl')))
    .map((folder) => dirname(realpathSync(join(folder, 'pg_ctl'))))

/**
 * @param {{ major?: number | undefined, debianFolder?: string, path?: string }} [options] `major`
 *   asks for that version alone where Debian's folders tell it
 * @returns {Programs | undefined}
 */
export const findPrograms = ({
  major,
  debianFolder = DEBIAN_FOLDER,
  path = process.env.PATH ?? '',
} = {}) => {
  const majors = majorsIn(debianFolder).filter((found) => major === undefined || found === major)
  for (const found of majors) {
    const bin = join(debianFolder, String(found), 'bin')
    if (isComplete(bin)) return { bin, major: found }
  }
  const bin = foldersInPath(path).find(isComplete)
  return bin === undefined ? undefined : { bin, major: undefined }
}

/**
 * @param {number | undefined} major that an existing cluster needs
 * @param {(line: string) => void} note
 * @returns {Promise<Programs>}
 */
export const ensurePrograms = async (major, note) => {
  const found = findPrograms({ major })
  if (found !== undefined) return found
  // An existing cluster can only be opened by its own major version.
  const name = major === undefined ? 'postgresql' : `postgresql-${major}`
  await installDebianPackages([name], note, OTHER_WAY)
  const installed = findPrograms({ major })
  if (installed === undefined)
    throw new Error(`${name} is installed, but ${NEEDED.join(', ')} are not found`)
  return installed
}
