import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { atEnd } from './ending.mjs'
import { formatHolder, isAlive, ownHolder, parseHolder } from './identity.mjs'

/**
 * @param {unknown} error
 * @param {string} code
 */
const hasCode = (error, code) => error instanceof Error && 'code' in error && error.code === code

/**
 * @param {string} file
 * @returns {string | undefined}
 */
const readIfThere = (file) => {
  try {
    return readFileSync(file, 'utf8')
  } catch (error) {
    if (hasCode(error, 'ENOENT')) return undefined
    throw error
  }
}

/**
 * A link is made whole or not at all, so nobody reads a lock that is not yet written.
 * @param {string} from
 * @param {string} to
 * @returns {boolean} false when `to` is there already
 */
const linkIfFree = (from, to) => {
  try {
    linkSync(from, to)
    return true
  } catch (error) {
    if (hasCode(error, 'EEXIST')) return false
    throw error
  }
}

/**
 * Sets a dead holder's lock aside. Only one of several who try gets the file by its rename; who
 * finds a living holder's in it (taken in between) puts it back.
 * @param {string} file
 * @param {string} aside
 */
const setDeadAside = (file, aside) => {
  try {
    renameSync(file, aside)
  } catch (error) {
    if (hasCode(error, 'ENOENT')) return
    throw error
  }
  const holder = parseHolder(readFileSync(aside, 'utf8'))
  if (holder !== undefined && isAlive(holder)) linkIfFree(aside, file)
  rmSync(aside, { force: true })
}

/**
 * Takes the lock, waiting while a living process holds it.
 * @param {string} file
 * @param {(pid: number) => void} [onWait] called once, with the holder's pid
 * @returns {Promise<() => void>} lets go of it
 */
export const takeLock = async (file, onWait) => {
  const own = formatHolder(ownHolder())
  const draft = `${file}.${own}`
  mkdirSync(dirname(file), { recursive: true })
  writeFileSync(draft, own)
  let hasWaited = false
  try {
    while (!linkIfFree(draft, file)) {
      const holder = parseHolder(readIfThere(file) ?? '')
      if (holder === undefined || !isAlive(holder)) {
        setDeadAside(file, `${draft}.dead`)
        continue
      }
      if (!hasWaited) onWait?.(holder.pid)
      hasWaited = true
      await delay(100)
    }
  } finally {
    rmSync(draft, { force: true })
  }
  const remove = () => {
    if (readIfThere(file) === own) rmSync(file, { force: true })
  }
  const forget = atEnd(remove)
  return () => {
    forget()
    remove()
  }
}

/**
 * @template T
 * @param {string} file
 * @param {((pid: number) => void) | undefined} onWait
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export const withLock = async (file, onWait, work) => {
  const release = await takeLock(file, onWait)
  try {
    return await work()
  } finally {
    release()
  }
}
