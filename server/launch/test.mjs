import './base/require-node.mjs'
import { print, seconds, step } from './base/steps.mjs'
import { closingLine, groupLines, judgeRun, sumCounts } from './checks/counts.mjs'
import { runVitest } from './checks/run-vitest.mjs'
import { runStaticChecks } from './checks/static-checks.mjs'
import { ensureTestTools } from './packages/test-tools.mjs'
import { useThrowAwayCluster } from './postgres/throw-away-cluster.mjs'
import { atEnd, runToEnd } from './process/ending.mjs'
import { prepare } from './product/prepare.mjs'
import { ensureBuild } from './product/product-build.mjs'

/** Tests get a name of their own for their database, so that nobody's data is ever tested on. */
const environment = { ...process.env }
delete environment.DATABASE_URL
delete environment.NODE_ENV

const prepareTests = () =>
  prepare(async (stateFolder) => {
    await step('Tools', ensureTestTools)
    const given = environment.TEST_DATABASE_URL
    const url =
      given || (await step('PostgreSQL', (report) => useThrowAwayCluster(stateFolder, report)))
    await step('Build', ensureBuild)
    return url
  })

const test = async () => {
  const begin = performance.now()
  const args = process.argv.slice(2)
  const url = await prepareTests()
  /** @type {[string, import('./checks/counts.mjs').Counts][]} */
  const groups = []
  if (args.length === 0) {
    print('Checks')
    groups.push(['checks', await runStaticChecks()])
  }
  const { code, report } = await runVitest(args, { ...environment, TEST_DATABASE_URL: url })
  const judged = judgeRun(code, report)
  groups.push(...judged.groups)
  const sum = sumCounts(groups.map(([, counts]) => counts))
  const time = `time  ${seconds(performance.now() - begin)}`
  closing = [...groupLines(groups), ...judged.remarks, time, '', closingLine(sum)].join('\n')
  return sum.failed === 0 && sum.passed > 0 ? 0 : 1
}

// A run that does not get as far as its summary has failed.
let closing = closingLine({ passed: 0, failed: 1, skipped: 0 })
// Cleanups run last first: registered before every other one, this prints the very last line.
atEnd(() => print(closing))
await runToEnd(test)
