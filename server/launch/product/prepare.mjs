import { join } from 'node:path'
import { step } from '../base/steps.mjs'
import { ensurePackages } from '../packages/npm-packages.mjs'
import { getStateFolder } from '../postgres/state-folder.mjs'
import { trackChildren } from '../process/children.mjs'
import { withLock } from '../process/lock.mjs'

/**
 * Packages first, then `work`, with no other launcher of this clone at it meanwhile.
 * @template T
 * @param {(stateFolder: string) => Promise<T>} work
 * @returns {Promise<T>}
 */
export const prepare = (work) => {
  const stateFolder = getStateFolder()
  const lock = join(stateFolder, 'launch.lock')
  /** @param {number} pid */
  const onOrphan = (pid) => {
    process.stderr.write(`Process ${pid} of a killed command is still at work; waiting for it.\n`)
  }
  /** @param {number} pid */
  const onWait = (pid) => {
    process.stderr.write(
      `Another command (process ${pid}) is making this clone ready; waiting for it.\n`,
    )
  }
  return withLock(lock, onWait, async () => {
    const endTracking = await trackChildren(join(stateFolder, 'children'), onOrphan)
    await step('Packages', ensurePackages)
    const result = await work(stateFolder)
    endTracking()
    return result
  })
}
