import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { onTestFinished } from 'vitest'

/** A folder with these files (path to content), gone when the test is. */
export const temporaryFolder = (files: Record<string, string> = {}) => {
  const folder = mkdtempSync(join(tmpdir(), 'foldyard-unit-'))
  onTestFinished(() => rmSync(folder, { recursive: true }))
  for (const [path, content] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, path)), { recursive: true })
    writeFileSync(join(folder, path), content)
  }
  return folder
}
