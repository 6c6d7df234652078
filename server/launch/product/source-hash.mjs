import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { listFiles } from './source-files.mjs'

/** Everything that can change what `vite build` writes. */
const BUILD_INPUTS = [
  'src',
  'server',
  'shared',
  'migrations',
  'seeds',
  'public',
  'index.html',
  'vite.config.ts',
  'tailwind.config.ts',
  'tsconfig.base.json',
  'tsconfig.json',
  'package.json',
  'package-lock.json',
]
const NOT_BUILT = ['server/launch']

/**
 * @param {string} root
 * @param {string[]} [entries]
 * @param {string[]} [skipped]
 * @returns {string} sha256 in hex over the names and contents of the sources
 */
export const hashSources = (root, entries = BUILD_INPUTS, skipped = NOT_BUILT) => {
  const hash = createHash('sha256')
  for (const file of listFiles(root, entries, skipped)) {
    const content = readFileSync(join(root, file))
    // The length keeps a name that ends in another file's first bytes apart from it.
    hash.update(`${file}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}
