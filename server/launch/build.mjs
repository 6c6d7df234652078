import './base/require-node.mjs'
import { step } from './base/steps.mjs'
import { runToEnd } from './process/ending.mjs'
import { prepare } from './product/prepare.mjs'
import { buildProduct } from './product/product-build.mjs'

await runToEnd(async () => {
  await prepare(() => step('Build', buildProduct))
  return 0
})
