import { spawn } from 'node:child_process'
import { setTimeout as delay } from 'node:timers/promises'
import { LaunchError } from '../base/launch-error.mjs'
import { ROOT } from '../base/repository.mjs'
import { atEnd } from '../process/ending.mjs'

const HEALTH_TIMEOUT = 60_000
const STOP_TIMEOUT = 10_000

/**
 * A web server as a child. It has an IPC channel, whose end tells it that the launcher is gone, and
 * a session of its own, so that Ctrl-C reaches it through the launcher alone, in the right order.
 * @typedef {object} WebProcess
 * @property {Promise<string>} ended resolves with how it ended
 * @property {() => Promise<void>} stop
 */

/**
 * @param {string[]} args for Node
 * @param {NodeJS.ProcessEnv} env
 * @returns {WebProcess}
 */
export const startWebProcess = (args, env) => {
  const child = spawn(process.execPath, args, {
    cwd: ROOT,
    env,
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    detached: true,
  })
  /** @type {Promise<string>} */
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message))
    child.once('exit', (code, signal) => resolve(signal ?? `exit ${code}`))
  })
  const stop = async () => {
    forget()
    if (child.exitCode !== null || child.signalCode !== null) return
    child.kill('SIGTERM')
    const timer = setTimeout(() => child.kill('SIGKILL'), STOP_TIMEOUT)
    await ended
    clearTimeout(timer)
  }
  const forget = atEnd(stop)
  return { ended, stop }
}

/**
 * @param {string} url
 * @returns {Promise<boolean>}
 */
const isHealthy = async (url) => {
  try {
    return (await fetch(url, { signal: AbortSignal.timeout(2000) })).status === 200
  } catch {
    return false
  }
}

/**
 * @param {WebProcess} web
 * @param {string} origin
 */
export const waitUntilHealthy = async (web, origin) => {
  /** @type {string | undefined} */
  let end
  void web.ended.then((how) => {
    end = how
  })
  const deadline = Date.now() + HEALTH_TIMEOUT
  while (!(await isHealthy(`${origin}/api/health`))) {
    if (end !== undefined) throw new LaunchError(`The server ended before it answered (${end}).`)
    if (Date.now() > deadline) throw new LaunchError(`${origin}/api/health does not answer.`)
    await delay(50)
  }
}
