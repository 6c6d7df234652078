import { LaunchError } from '../base/launch-error.mjs'

/** @typedef {() => void | Promise<void>} Cleanup */

/**
 * Milliseconds. Ctrl-C comes twice, from the terminal and from npm; only a later one means haste.
 */
const SAME_SIGNAL = 1000

/** @type {Cleanup[]} */
const cleanups = []
/** @type {Promise<never> | undefined} */
let ending

/** @returns {boolean} whether the command is already on its way out */
export const isEnding = () => ending !== undefined

/**
 * Registers what must be undone, last first, however the command ends (but for kill -9).
 * @param {Cleanup} cleanup
 * @returns {() => void} forgets it again
 */
export const atEnd = (cleanup) => {
  cleanups.push(cleanup)
  return () => {
    const index = cleanups.lastIndexOf(cleanup)
    if (index >= 0) cleanups.splice(index, 1)
  }
}

/** @param {unknown} error */
const report = (error) => {
  const text =
    error instanceof LaunchError
      ? error.message
      : error instanceof Error
        ? (error.stack ?? error.message)
        : String(error)
  process.stderr.write(`\n${text}\n`)
}

/**
 * @param {number} code
 * @returns {Promise<never>}
 */
const end = (code) => {
  ending ??= (async () => {
    let status = code
    for (let cleanup = cleanups.pop(); cleanup !== undefined; cleanup = cleanups.pop()) {
      try {
        await cleanup()
      } catch (error) {
        report(error)
        status = status === 0 ? 1 : status
      }
    }
    process.exit(status)
  })()
  return ending
}

/**
 * npm may be killed without a word to its child; its death shows as a new parent.
 * @param {() => void} onDeath
 */
const watchNpm = (onDeath) => {
  if (process.env.npm_lifecycle_event === undefined) return
  const parent = process.ppid
  setInterval(() => {
    if (process.ppid !== parent) onDeath()
  }, 500).unref()
}

/**
 * Runs a command to its end: `main` gives the exit code; signals, npm's death and errors all run
 * the registered cleanups. A signal while they run ends at once.
 * @param {() => Promise<number>} main
 * @param {{ isServer?: boolean, onFailure?: () => void }} [options] a server that is told to stop
 *   has done its work (exit 0); anything else was cut short (128 + signal). `onFailure` runs after
 *   an error was reported.
 */
export const runToEnd = async (main, { isServer = false, onFailure } = {}) => {
  let firstSignal = -Infinity
  const signals = /** @type {const} */ ([
    ['SIGHUP', 1],
    ['SIGINT', 2],
    ['SIGTERM', 15],
  ])
  for (const [signal, number] of signals) {
    process.on(signal, () => {
      if (isEnding()) {
        if (performance.now() - firstSignal > SAME_SIGNAL) process.exit(128 + number)
        return
      }
      firstSignal = performance.now()
      process.stderr.write('\nStopping.\n')
      void end(isServer ? 0 : 128 + number)
    })
  }
  watchNpm(() => void end(1))
  let code = 1
  try {
    code = await main()
  } catch (error) {
    if (!isEnding()) {
      report(error)
      onFailure?.()
    }
  }
  await end(code)
}
