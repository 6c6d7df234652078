import { randomBytes } from 'node:crypto'
import { readPrivateJson, writePrivateJson } from '../postgres/private-file.mjs'
import { join } from 'node:path'

/**
 * The session secret: SESSION_SECRET when set, otherwise one made once and kept beside the
 * database, so that a restart signs nobody out.
 * @param {string} stateFolder
 * @returns {string}
 */
export const sessionSecret = (stateFolder) => {
  if (process.env.SESSION_SECRET) return process.env.SESSION_SECRET
  const file = join(stateFolder, 'secrets.json')
  const kept = readPrivateJson(file)?.sessionSecret
  if (typeof kept === 'string') return kept
  const made = randomBytes(48).toString('base64url')
  writePrivateJson(file, { sessionSecret: made })
  return made
}
