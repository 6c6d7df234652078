import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { findProcess, formatHolder, isAlive, parseHolder } from './identity.mjs'

/** @type {string | undefined} */
let folder

/**
 * @param {number | undefined} pid of a child just started, undefined when it could not be
 * @returns {() => void} to be called when it has ended
 */
export const noteChild = (pid) => {
  const startTime = pid === undefined ? undefined : findProcess(pid)?.startTime
  if (folder === undefined || pid === undefined || startTime === undefined) return () => undefined
  const file = join(folder, formatHolder({ pid, startTime }))
  writeFileSync(file, '')
  return () => rmSync(file, { force: true })
}

/**
 * A killed launcher cannot take npm or a build with it: they go on, and would write between the
 * files of the next one. So children are noted in a folder, and those of a dead launcher are waited
 * for.
 * @param {string} place
 * @param {(pid: number) => void} [onWait]
 * @returns {Promise<() => void>} ends the noting
 */
export const trackChildren = async (place, onWait) => {
  mkdirSync(place, { recursive: true })
  for (const name of readdirSync(place)) {
    const holder = parseHolder(name)
    if (holder !== undefined && isAlive(holder)) onWait?.(holder.pid)
    while (holder !== undefined && isAlive(holder)) await delay(100)
    rmSync(join(place, name), { force: true })
  }
  folder = place
  return () => {
    folder = undefined
  }
}
