import { existsSync, readFileSync } from 'node:fs'

const HAS_PROC = existsSync('/proc/self/stat')

/**
 * A process named so that a later one with the same number is not taken for it.
 * `startTime` is in clock ticks since boot, `'0'` where the system does not tell.
 * @typedef {{ pid: number, startTime: string }} Holder
 */

/**
 * @param {string} stat the text of /proc/PID/stat
 * @returns {{ name: string, state: string, startTime: string } | undefined}
 */
export const parseStat = (stat) => {
  // The name is in brackets and may itself hold brackets and blanks.
  const open = stat.indexOf('(')
  const close = stat.lastIndexOf(')')
  if (open < 0 || close < open) return undefined
  const fields = stat
    .slice(close + 1)
    .trim()
    .split(/\s+/)
  const state = fields[0]
  const startTime = fields[19]
  if (state === undefined || startTime === undefined) return undefined
  return { name: stat.slice(open + 1, close), state, startTime }
}

/**
 * @param {number} pid
 * @returns {{ name: string, startTime: string } | undefined} undefined when no such process lives
 *   (a zombie does not)
 */
export const findProcess = (pid) => {
  if (!HAS_PROC) return isSignalable(pid) ? { name: '', startTime: '0' } : undefined
  let text
  try {
    text = readFileSync(`/proc/${pid}/stat`, 'utf8')
  } catch {
    return undefined
  }
  const stat = parseStat(text)
  if (stat === undefined || stat.state === 'Z' || stat.state === 'X') return undefined
  return { name: stat.name, startTime: stat.startTime }
}

/** @param {number} pid */
const isSignalable = (pid) => {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    // EPERM: it lives, but belongs to somebody else.
    return error instanceof Error && 'code' in error && error.code === 'EPERM'
  }
}

/** @returns {Holder} this very process */
export const ownHolder = () => ({
  pid: process.pid,
  startTime: findProcess(process.pid)?.startTime ?? '0',
})

/** @param {Holder} holder */
export const formatHolder = (holder) => `${holder.pid}-${holder.startTime}`

/**
 * @param {string} text as written by `formatHolder`
 * @returns {Holder | undefined}
 */
export const parseHolder = (text) => {
  const match = /^(\d+)-(\d+)$/.exec(text.trim())
  if (match === null || match[1] === undefined || match[2] === undefined) return undefined
  return { pid: Number(match[1]), startTime: match[2] }
}

/** @param {Holder} holder */
export const isAlive = (holder) => findProcess(holder.pid)?.startTime === holder.startTime
