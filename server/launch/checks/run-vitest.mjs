import { spawn } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { inRoot, ROOT } from '../base/repository.mjs'
import { atEnd } from '../process/ending.mjs'

const STOP_TIMEOUT = 10_000

/**
 * Runs the tests, showing their output as it comes.
 * @param {string[]} args further arguments for the runner
 * @param {NodeJS.ProcessEnv} env
 * @returns {Promise<{ code: number, report: import('./counts.mjs').TestReport | undefined }>}
 */
export const runVitest = async (args, env) => {
  const folder = mkdtempSync(join(tmpdir(), 'foldyard-test-'))
  atEnd(() => rmSync(folder, { recursive: true, force: true }))
  const file = join(folder, 'report.json')
  const child = spawn(
    process.execPath,
    [
      inRoot('node_modules/vitest/vitest.mjs'),
      'run',
      '--reporter=default',
      `--reporter=${inRoot('server/launch/checks/vitest-reporter.mjs')}`,
      ...args,
    ],
    {
      cwd: ROOT,
      env: { ...env, TEST_REPORT_FILE: file },
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    },
  )
  /** @type {Promise<number>} */
  const ended = new Promise((resolve, reject) => {
    child.once('error', reject)
    child.once('exit', (code) => resolve(code ?? 128))
  })
  const forget = atEnd(async () => {
    child.kill('SIGTERM')
    const timer = setTimeout(() => child.kill('SIGKILL'), STOP_TIMEOUT)
    await ended
    clearTimeout(timer)
  })
  const code = await ended
  forget()
  return { code, report: existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : undefined }
}
