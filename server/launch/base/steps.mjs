const LABEL_WIDTH = 12

let output = process.stdout

/** Sends progress to stderr, for commands whose stdout is their answer. */
export const reportToStderr = () => {
  output = /** @type {typeof output} */ (/** @type {unknown} */ (process.stderr))
}

/** @param {string} line */
export const print = (line) => {
  output.write(`${line}\n`)
}

/**
 * @param {number} milliseconds
 * @returns {string} seconds with two digits, such as `0.12 s`
 */
export const seconds = (milliseconds) => `${(milliseconds / 1000).toFixed(2)} s`

/**
 * Runs one step and prints what it did and how long it took.
 * @template T
 * @param {string} label one or two words
 * @param {(report: { note: (line: string) => void, done: (line: string) => void }) => Promise<T>} work
 *   calls `note` before something slow and `done` with what the step found or did
 * @returns {Promise<T>}
 */
export const step = async (label, work) => {
  const begin = performance.now()
  let outcome = 'done'
  const head = label.padEnd(LABEL_WIDTH)
  const result = await work({
    note: (line) => print(`${head}${line}`),
    done: (line) => {
      outcome = line
    },
  })
  print(`${head}${outcome} (${seconds(performance.now() - begin)})`)
  return result
}
