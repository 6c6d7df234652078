// Imported first by every command: modules are evaluated in the order of their imports, so an old
// Node ends here with a sentence and not further down with a missing function.
import { isNodeNewEnough, OLDEST_NODE } from './node-version.mjs'

if (!isNodeNewEnough(process.versions.node)) {
  process.stderr.write(
    `Foldyard needs Node ${OLDEST_NODE} or newer; this is Node ${process.versions.node} (${process.execPath}).\n`,
  )
  process.exit(1)
}
