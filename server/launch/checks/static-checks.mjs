import { inRoot } from '../base/repository.mjs'
import { print, seconds } from '../base/steps.mjs'
import { run } from '../process/run-command.mjs'
import { noCounts } from './counts.mjs'

const TSC = 'node_modules/typescript/bin/tsc'

/** @type {{ name: string, args: string[] }[]} the longest first, so that two at a time end together */
const CHECKS = [
  { name: 'lint', args: ['node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0'] },
  { name: 'types src', args: [TSC, '-p', 'src'] },
  { name: 'types tests', args: [TSC, '-p', 'tests'] },
  { name: 'types server', args: [TSC, '-p', 'server'] },
  { name: 'types shared', args: [TSC, '-p', 'shared'] },
  { name: 'types launch', args: [TSC, '-p', 'server/launch'] },
  { name: 'format', args: ['node_modules/prettier/bin/prettier.cjs', '--check', '.'] },
]

/** @param {(typeof CHECKS)[number]} check */
const runCheck = async ({ name, args: [script = '', ...args] }) => {
  const begin = performance.now()
  const { code, output } = await run(process.execPath, [inRoot(script), ...args])
  const took = seconds(performance.now() - begin)
  print(
    code === 0 ? `  ${name}: passed (${took})` : `  ${name}: FAILED (${took})\n${output.trimEnd()}`,
  )
  return code === 0
}

/**
 * Types, lint and format, two at a time.
 * @returns {Promise<import('./counts.mjs').Counts>} one each
 */
export const runStaticChecks = async () => {
  const counts = noCounts()
  const waiting = [...CHECKS]
  const worker = async () => {
    for (let check = waiting.shift(); check !== undefined; check = waiting.shift()) {
      counts[(await runCheck(check)) ? 'passed' : 'failed'] += 1
    }
  }
  await Promise.all([worker(), worker()])
  return counts
}
