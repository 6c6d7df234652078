import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { formatHolder, isAlive, ownHolder, parseHolder } from './identity.mjs'

/**
 * Signs this process up as a user of what `folder` stands for.
 * @param {string} folder
 */
export const addLease = (folder) => {
  mkdirSync(folder, { recursive: true })
  writeFileSync(join(folder, formatHolder(ownHolder())), '')
}

/**
 * Signs this process off, and those that died without doing so.
 * @param {string} folder
 * @returns {number} how many living users are left
 */
export const dropLease = (folder) => {
  mkdirSync(folder, { recursive: true })
  const own = formatHolder(ownHolder())
  let left = 0
  for (const name of readdirSync(folder)) {
    const holder = parseHolder(name)
    if (name !== own && holder !== undefined && isAlive(holder)) left += 1
    else rmSync(join(folder, name), { force: true })
  }
  return left
}
