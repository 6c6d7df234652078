import { spawn } from 'node:child_process'
import { LaunchError } from '../base/launch-error.mjs'
import { ROOT } from '../base/repository.mjs'
import { noteChild } from './children.mjs'
import { atEnd, isEnding } from './ending.mjs'

/**
 * @typedef {object} RunOptions
 * @property {string} [cwd] the repository when left out
 * @property {NodeJS.ProcessEnv} [env]
 * @property {{ uid: number, gid: number } | undefined} [account] runs it as this account
 * @property {string} [input] written to its stdin
 * @property {boolean} [inherit] shows its output instead of gathering it
 * @property {boolean} [whileEnding] allowed even when the launcher is stopping
 */

/**
 * @param {string} program
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<{ code: number, output: string }>} `code` is 128 when a signal ended it;
 *   `output` is stdout and stderr as they came
 */
export const run = (program, args, options = {}) => {
  if (isEnding() && options.whileEnding !== true) {
    return Promise.reject(new LaunchError('Stopping.'))
  }
  const shown = options.inherit === true
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd: options.cwd ?? ROOT,
      env: options.env ?? process.env,
      stdio: [
        options.input === undefined ? 'ignore' : 'pipe',
        shown ? 'inherit' : 'pipe',
        shown ? 'inherit' : 'pipe',
      ],
      ...options.account,
    })
    const forgetChild = noteChild(child.pid)
    const forgetKill = atEnd(() => {
      child.kill('SIGTERM')
    })
    const forget = () => {
      forgetChild()
      forgetKill()
    }
    /** @type {Buffer[]} */
    const chunks = []
    child.stdout?.on('data', (chunk) => chunks.push(chunk))
    child.stderr?.on('data', (chunk) => chunks.push(chunk))
    child.once('error', (error) => {
      forget()
      reject(new LaunchError(`Could not run ${program}: ${error.message}`))
    })
    child.once('close', (code) => {
      forget()
      resolve({ code: code ?? 128, output: Buffer.concat(chunks).toString('utf8') })
    })
    // A program that ends before it has read its input breaks the pipe; its exit code tells why.
    child.stdin?.on('error', () => undefined)
    child.stdin?.end(options.input)
  })
}

/**
 * @param {string} text
 * @param {number} [count]
 * @returns {string} its last lines
 */
export const lastLines = (text, count = 40) => text.trimEnd().split('\n').slice(-count).join('\n')

/**
 * As `run`, but anything else than exit 0 throws.
 * @param {string} purpose begins the message, such as `npm ci`
 * @param {string} program
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<string>} the output
 */
export const runOrThrow = async (purpose, program, args, options) => {
  const { code, output } = await run(program, args, options)
  if (code !== 0) {
    throw new LaunchError(`${purpose} failed (exit ${code}).\n${lastLines(output)}`.trimEnd())
  }
  return output
}
