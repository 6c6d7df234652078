import './base/require-node.mjs'
import { spawn } from 'node:child_process'
import { inRoot, ROOT } from './base/repository.mjs'
import { reportToStderr } from './base/steps.mjs'
import { findReasonToInstall } from './packages/npm-packages.mjs'
import { atEnd, runToEnd } from './process/ending.mjs'
import { prepare } from './product/prepare.mjs'

/** @returns {Promise<number>} the kernel's exit code */
const kernel = () =>
  new Promise((resolve, reject) => {
    const args = ['--import', 'tsx', inRoot('server/kernel/main.ts'), ...process.argv.slice(2)]
    const child = spawn(process.execPath, args, { cwd: ROOT, stdio: 'inherit' })
    atEnd(() => {
      child.kill('SIGTERM')
    })
    child.once('error', reject)
    child.once('exit', (code) => resolve(code ?? 128))
  })

await runToEnd(async () => {
  reportToStderr()
  if (findReasonToInstall() !== undefined) await prepare(async () => undefined)
  return kernel()
})
