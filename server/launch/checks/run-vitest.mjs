import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { LaunchError } from '../base/launch-error.mjs'
import { inRoot, ROOT } from '../base/repository.mjs'
import { atEnd, isEnding } from '../process/ending.mjs'

const STOP_TIMEOUT = 10_000

/**
 * Runs the tests, showing their output as it comes.
 * @param {string[]} args further arguments for the runner
 * @param {NodeJS.ProcessEnv} env
 * @returns {Promise<{ code: number, report: import('./counts.mjs').TestReport | undefined }>}
 */
export const runVitest = async (args, env) => {
  if (isEnding()) throw new LaunchError('Stopping.')
  const reporter = inRoot('server/launch/checks/vitest-reporter.mjs')
  const child = spawn(
    process.execPath,
    [
      ...[inRoot('node_modules/vitest/vitest.mjs'), 'run'],
      ...['--reporter=default', `--reporter=${reporter}`, ...args],
    ],
    { cwd: ROOT, env, stdio: ['ignore', 'inherit', 'inherit', 'ipc'] },
  )
  /** @type {import('./counts.mjs').TestReport | undefined} */
  let report
  child.on('message', (message) => {
    report = /** @type {import('./counts.mjs').TestReport} */ (message)
  })
  // The channel closes after its last message was read, which can be after the exit.
  const closed = once(child, 'disconnect')
  const ended = once(child, 'exit')
  const forget = atEnd(async () => {
    child.kill('SIGTERM')
    const timer = setTimeout(() => child.kill('SIGKILL'), STOP_TIMEOUT)
    await ended
    clearTimeout(timer)
  })
  const [code] = await ended
  await closed
  forget()
  return { code: code ?? 128, report }
}
