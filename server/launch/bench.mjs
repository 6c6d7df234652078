import './base/require-node.mjs'
import { step } from './base/steps.mjs'
import { useThrowAwayCluster } from './postgres/throw-away-cluster.mjs'
import { runToEnd } from './process/ending.mjs'
import { run } from './process/run-command.mjs'
import { prepare } from './product/prepare.mjs'
import { ensureBuild } from './product/product-build.mjs'

await runToEnd(async () => {
  const url = await prepare(async (stateFolder) => {
    await step('Build', ensureBuild)
    return step('PostgreSQL', (report) => useThrowAwayCluster(stateFolder, report))
  })
  const { code } = await run(
    process.execPath,
    ['--import', 'tsx', 'tests/bench/main.ts', ...process.argv.slice(2)],
    { env: { ...process.env, TEST_DATABASE_URL: url }, inherit: true },
  )
  return code
})
