import { noCounts } from './counts.mjs'

/**
 * What is read of the runner's TestModule.
 * @typedef {{ errors: () => ReadonlyArray<unknown> }} Part
 * @typedef {{ result: () => { state: 'passed' | 'failed' | 'skipped' | 'pending' } }} Test
 * @typedef {Part & { children: { allTests: () => Iterable<Test>, allSuites: () => Iterable<Part> } }} Module
 */

/**
 * @param {Module} module
 * @returns {import('./counts.mjs').Counts} its tests, and as one failure each the file or suite
 *   that has errors of its own (it did not load, or a hook threw)
 */
export const countModule = (module) => {
  const counts = noCounts()
  for (const test of module.children.allTests()) {
    const { state } = test.result()
    // A test that never finished did not pass.
    counts[state === 'pending' ? 'failed' : state] += 1
  }
  for (const part of [module, ...module.children.allSuites()]) {
    if (part.errors().length > 0) counts.failed += 1
  }
  return counts
}

/**
 * Sends the counts by project to the launcher that started the run, and ends the run when that
 * launcher is gone.
 */
export default class CountReporter {
  /** @param {import('vitest/node').Vitest} vitest */
  onInit(vitest) {
    process.once('disconnect', () => void vitest.exit(true))
    // Listening holds the process open; the channel alone must not.
    process.channel?.unref()
  }

  /**
   * @param {ReadonlyArray<import('vitest/node').TestModule>} modules
   * @param {ReadonlyArray<unknown>} unhandledErrors
   * @returns {Promise<void>}
   */
  onTestRunEnd(modules, unhandledErrors) {
    /** @type {import('./counts.mjs').TestReport} */
    const report = { projects: {}, unhandledErrors: unhandledErrors.length }
    for (const module of modules) {
      const counts = (report.projects[module.project.name] ??= noCounts())
      const own = countModule(module)
      counts.passed += own.passed
      counts.failed += own.failed
      counts.skipped += own.skipped
    }
    return new Promise((resolve, reject) => {
      if (process.send === undefined) throw new Error('This reporter is for the launcher alone.')
      process.send(report, (/** @type {Error | null} */ error) =>
        error ? reject(error) : resolve(),
      )
    })
  }
}
