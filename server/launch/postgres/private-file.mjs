import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { LaunchError } from '../base/launch-error.mjs'

/**
 * @param {string} file
 * @returns {Record<string, unknown> | undefined} undefined when there is no such file
 */
export const readPrivateJson = (file) => {
  if (!existsSync(file)) return undefined
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    throw new LaunchError(
      `${file} cannot be read: ${error instanceof Error ? error.message : error}`,
    )
  }
}

/**
 * Writes for the owner's eyes only, whole or not at all.
 * @param {string} file
 * @param {Record<string, unknown>} value
 */
export const writePrivateJson = (file, value) => {
  const draft = `${file}.${process.pid}`
  writeFileSync(draft, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 })
  renameSync(draft, file)
}
