import { statSync } from 'node:fs'
import { join } from 'node:path'
import { ROOT } from '../base/repository.mjs'
import { atEnd } from '../process/ending.mjs'
import { listFiles } from './source-files.mjs'

/**
 * @param {string[]} entries
 * @returns {string} changes with every file that is added, removed or written
 */
const stampOf = (entries) =>
  listFiles(ROOT, entries, ['server/launch'])
    .map((file) => `${file}:${statSync(join(ROOT, file), { throwIfNoEntry: false })?.mtimeMs}`)
    .join('\n')

/**
 * Looks at the files a few times a second, which sees every way of saving a file on every file
 * system; the listing takes some milliseconds.
 * @param {string[]} entries files and folders below the repository
 * @param {() => void} onChange
 */
export const watchSources = (entries, onChange) => {
  let stamp = stampOf(entries)
  const timer = setInterval(() => {
    const next = stampOf(entries)
    if (next === stamp) return
    stamp = next
    onChange()
  }, 400)
  atEnd(() => clearInterval(timer))
}
