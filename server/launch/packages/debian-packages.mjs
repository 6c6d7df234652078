import { existsSync } from 'node:fs'
import { LaunchError } from '../base/launch-error.mjs'
import { runOrThrow } from '../process/run-command.mjs'

const INSTALL = ['install', '-y', '--no-install-recommends', '-o', 'DPkg::Lock::Timeout=300']

/** @param {string[]} names */
const commandFor = (names) =>
  `apt-get update && apt-get install -y --no-install-recommends ${names.join(' ')}`

/**
 * @param {string[]} names packages that are missing
 * @param {{ isRoot: boolean, hasApt: boolean }} machine
 * @returns {string | undefined} what a person must do by hand; undefined when the launcher can
 *   install them itself
 */
export const findInstallHint = (names, { isRoot, hasApt }) => {
  if (isRoot && hasApt) return undefined
  const list = names.join(', ')
  if (!hasApt)
    return `Not found: ${list}. Install what this system calls the Debian package(s) of that name.`
  return `Not found: ${list}. Run this once, then start again:\n\n  sudo sh -c '${commandFor(names)}'`
}

/**
 * Installs Debian packages, or throws with the one command that does.
 * @param {string[]} names
 * @param {(line: string) => void} note
 * @param {string} [otherWay] a further way out, shown with the command
 */
export const installDebianPackages = async (names, note, otherWay) => {
  const hint = findInstallHint(names, {
    isRoot: process.getuid?.() === 0,
    hasApt: existsSync('/usr/bin/apt-get'),
  })
  if (hint !== undefined) throw new LaunchError([hint, otherWay].filter(Boolean).join('\n\n'))
  note(`installing from Debian: ${names.join(', ')}`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  await runOrThrow('apt-get update', '/usr/bin/apt-get', ['update', '-q'], { env })
  await runOrThrow('apt-get install', '/usr/bin/apt-get', [...INSTALL, '-q', ...names], { env })
}
