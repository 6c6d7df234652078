import { existsSync, readFileSync } from 'node:fs'
import { basename } from 'node:path'
import { LaunchError } from '../base/launch-error.mjs'
import { inRoot } from '../base/repository.mjs'
import { runOrThrow } from '../process/run-command.mjs'
import { findLockMismatch, findStalePackage } from './lock-check.mjs'

/** @param {string} file */
const readJson = (file) => JSON.parse(readFileSync(inRoot(file), 'utf8'))

/** @returns {string | undefined} why the packages must be installed, undefined when they need not */
export const findReasonToInstall = () => {
  if (!existsSync(inRoot('node_modules'))) return 'not installed'
  if (!existsSync(inRoot('node_modules/.package-lock.json'))) return 'installation not finished'
  const stale = findStalePackage(
    readJson('package-lock.json'),
    readJson('node_modules/.package-lock.json'),
    (path) => existsSync(inRoot(path, 'package.json')),
  )
  return stale === undefined ? undefined : `${stale} differs from the lock`
}

/**
 * @returns {[string, string[]]} npm as this process was started by it, or the one in PATH
 */
const npmCommand = () => {
  const cli = process.env.npm_execpath
  return cli !== undefined && basename(cli) === 'npm-cli.js'
    ? [process.execPath, [cli]]
    : ['npm', []]
}

/**
 * Installs exactly what the lock names. All of it: the product is built here, with tools that npm
 * leaves out when NODE_ENV says production.
 */
export const installPackages = async () => {
  const mismatch = findLockMismatch(readJson('package.json'), readJson('package-lock.json'))
  if (mismatch !== undefined) {
    throw new LaunchError(
      `package.json and package-lock.json disagree about ${mismatch}. Run npm install and keep both files.`,
    )
  }
  const [program, args] = npmCommand()
  const env = { ...process.env }
  delete env.NODE_ENV
  await runOrThrow(
    'npm ci',
    program,
    [...args, 'ci', '--include=dev', '--include=optional', '--no-audit', '--no-fund'],
    { env },
  )
}

/**
 * @param {{ note: (line: string) => void, done: (line: string) => void }} report
 */
export const ensurePackages = async ({ note, done }) => {
  const reason = findReasonToInstall()
  if (reason === undefined) return done('present')
  note(`${reason}: npm ci`)
  await installPackages()
  const left = findReasonToInstall()
  done(left === undefined ? 'installed' : `installed, although ${left}: npm ci will run every time`)
}
