/**
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 * @typedef {{ projects: Record<string, Counts>, unhandledErrors: number }} TestReport
 */

/** @returns {Counts} */
export const noCounts = () => ({ passed: 0, failed: 0, skipped: 0 })

/**
 * @param {Counts[]} all
 * @returns {Counts}
 */
export const sumCounts = (all) =>
  all.reduce(
    (sum, counts) => ({
      passed: sum.passed + counts.passed,
      failed: sum.failed + counts.failed,
      skipped: sum.skipped + counts.skipped,
    }),
    noCounts(),
  )

/**
 * What a run of the test runner comes to. It must not pass for a reason that no count shows: errors
 * outside every test, an exit code without a failed test, a report that was never written and a
 * run without tests are failures of their own.
 * @param {number} code the runner's exit code
 * @param {TestReport | undefined} report
 * @returns {{ groups: [string, Counts][], remarks: string[] }} `groups` by project, with a further
 *   group `run` when there is such a failure; `remarks` say why
 */
export const judgeRun = (code, report) => {
  const groups = Object.entries(report?.projects ?? {})
  const sum = sumCounts(groups.map(([, counts]) => counts))
  /** @type {string[]} */
  const remarks = []
  let failed = 0
  if (report === undefined) {
    failed += 1
    remarks.push(`The test runner ended without a report (exit ${code}).`)
  } else if (report.unhandledErrors > 0) {
    failed += report.unhandledErrors
    remarks.push(`Errors outside every test: ${report.unhandledErrors}.`)
  }
  if (report !== undefined && sum.passed + sum.failed === 0) {
    failed += 1
    remarks.push('No test ran.')
  }
  if (code !== 0 && sum.failed + failed === 0) {
    failed += 1
    remarks.push(`The test runner ended with exit ${code} although no test failed.`)
  }
  if (failed > 0) groups.push(['run', { ...noCounts(), failed }])
  return { groups, remarks }
}

/**
 * @param {[string, Counts][]} groups
 * @returns {string[]} a line for each group, in columns
 */
export const groupLines = (groups) => {
  const width = Math.max(0, ...groups.map(([name]) => name.length))
  return groups.map(([name, { passed, failed, skipped }]) => {
    const more = [failed > 0 ? `, ${failed} failed` : '', skipped > 0 ? `, ${skipped} skipped` : '']
    return `${name.padEnd(width)}  ${String(passed).padStart(5)} passed${more.join('')}`
  })
}

/**
 * @param {Counts} sum
 * @returns {string} the line that closes the output
 */
export const closingLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`
