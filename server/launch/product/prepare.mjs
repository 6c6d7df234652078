import { join } from 'node:path'
import { step } from '../base/steps.mjs'
import { ensurePackages } from '../packages/npm-packages.mjs'
import { getStateFolder } from '../postgres/state-folder.mjs'
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
  const onWait = (pid) => {
    process.stderr.write(
      `Another command (process ${pid}) is making this clone ready; waiting for it.\n`,
    )
  }
  return withLock(lock, onWait, async () => {
    await step('Packages', ensurePackages)
    return work(stateFolder)
  })
}
