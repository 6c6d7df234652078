import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { inRoot, ROOT } from '../base/repository.mjs'
import { runOrThrow } from '../process/run-command.mjs'
import { hashSources } from './source-hash.mjs'

/** Written last, so that a build cut short counts as none. */
const RECORD = inRoot('dist/.inputs')
const OUTPUTS = [
  'dist/client/index.html',
  'dist/server/index.js',
  'dist/server/plan-worker.js',
  'dist/server/cli.js',
]

/**
 * @param {string} hash of the sources as they are now
 * @returns {boolean}
 */
const isBuilt = (hash) =>
  existsSync(RECORD) &&
  readFileSync(RECORD, 'utf8') === hash &&
  OUTPUTS.every((file) => existsSync(inRoot(file)))

/** @param {string[]} args */
const vite = (args) => {
  const env = { ...process.env }
  // Vite builds for development when told so; the product is always built for use.
  delete env.NODE_ENV
  return runOrThrow(
    ['vite', 'build', ...args].join(' '),
    process.execPath,
    [inRoot('node_modules/vite/bin/vite.js'), 'build', ...args],
    { env },
  )
}

/** Builds client and server into dist. */
export const buildProduct = async () => {
  const hash = hashSources(ROOT)
  rmSync(RECORD, { force: true })
  await Promise.all([vite([]), vite(['--ssr'])])
  writeFileSync(RECORD, hash)
}

/**
 * @param {{ note: (line: string) => void, done: (line: string) => void }} report
 */
export const ensureBuild = async ({ note, done }) => {
  if (isBuilt(hashSources(ROOT))) return done('up to date')
  note('building client and server')
  await buildProduct()
  done('built')
}
