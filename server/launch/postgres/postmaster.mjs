import { existsSync, readdirSync, readFileSync, readlinkSync, realpathSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { LaunchError } from '../base/launch-error.mjs'
import { findProcess } from '../process/identity.mjs'

/**
 * @param {string} text of postmaster.pid
 * @returns {{ pid: number, port: number | undefined, isReady: boolean } | undefined}
 */
export const parsePostmasterFile = (text) => {
  const lines = text.split('\n').map((line) => line.trim())
  const pid = Number(lines[0])
  if (!Number.isInteger(pid) || pid <= 0) return undefined
  const port = Number(lines[3])
  return { pid, port: port > 0 ? port : undefined, isReady: lines[7] === 'ready' }
}

/**
 * @param {number} pid
 * @returns {string | undefined} its working folder, where the system tells
 */
const folderOf = (pid) => {
  try {
    return readlinkSync(`/proc/${pid}/cwd`)
  } catch {
    return undefined
  }
}

/**
 * The server that runs on this data folder. A pid file of a dead server, or one whose number has
 * since gone to another program, is none: the server works inside its data folder and no other
 * program does.
 * @param {string} data
 */
export const findPostmaster = (data) => {
  const file = join(data, 'postmaster.pid')
  if (!existsSync(file)) return undefined
  const postmaster = parsePostmasterFile(readFileSync(file, 'utf8'))
  if (postmaster === undefined) return undefined
  const found = findProcess(postmaster.pid)
  if (found === undefined || !['', 'postgres'].includes(found.name)) return undefined
  const folder = folderOf(postmaster.pid)
  return folder === undefined || folder === realpathSync(data) ? postmaster : undefined
}

/**
 * @param {string} data
 * @returns {number} how many processes work inside the data folder
 */
const countWorkers = (data) => {
  if (!existsSync('/proc/self')) return 0
  const folder = realpathSync(data)
  return readdirSync('/proc').filter(
    (name) => /^\d+$/.test(name) && folderOf(Number(name)) === folder,
  ).length
}

/**
 * Removes the pid file that a killed server left. Its last workers end by themselves within
 * moments; starting beside them could spoil the data, so they are waited for.
 * @param {string} data
 */
export const clearDeadPostmaster = async (data) => {
  for (let tries = 0; countWorkers(data) > 0; tries += 1) {
    if (tries === 100) {
      throw new LaunchError(`Processes of a database server that was killed still work in ${data}.`)
    }
    await delay(100)
  }
  rmSync(join(data, 'postmaster.pid'), { force: true })
}
