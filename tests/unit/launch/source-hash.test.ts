import { renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { listFiles } from '../../../server/launch/product/source-files.mjs'
import { hashSources } from '../../../server/launch/product/source-hash.mjs'
import { temporaryFolder } from './temporary-folder'

const FILES = {
  'src/main.ts': 'a',
  'src/deep/part.ts': 'b',
  'server/index.ts': 'c',
  'server/launch/start.mjs': 'd',
  'index.html': 'e',
  'README.md': 'f',
}
const ENTRIES = ['src', 'server', 'index.html', 'not-there']
const SKIPPED = ['server/launch']

describe('the sources', () => {
  it('are the files below the entries, sorted, without the skipped folders', () => {
    expect(listFiles(temporaryFolder(FILES), ENTRIES, SKIPPED)).toEqual([
      'index.html',
      'server/index.ts',
      'src/deep/part.ts',
      'src/main.ts',
    ])
  })
})

describe('the hash of the sources', () => {
  const hashAfter = (change: (folder: string) => void) => {
    const folder = temporaryFolder(FILES)
    change(folder)
    return hashSources(folder, ENTRIES, SKIPPED)
  }
  const untouched = () => hashAfter(() => undefined)

  it('is the same for the same files in another place', () => {
    expect(untouched()).toBe(untouched())
  })

  it.each<[string, (folder: string) => void]>([
    ['is written', (folder) => writeFileSync(join(folder, 'src/main.ts'), 'A')],
    ['is added', (folder) => writeFileSync(join(folder, 'src/new.ts'), '')],
    ['is removed', (folder) => rmSync(join(folder, 'src/main.ts'))],
    ['is renamed', (folder) => renameSync(join(folder, 'src/main.ts'), join(folder, 'src/m.ts'))],
  ])('changes when a source %s', (_, change) => {
    expect(hashAfter(change)).not.toBe(untouched())
  })

  it.each(['README.md', 'server/launch/start.mjs'])('does not change with %s', (file) => {
    expect(hashAfter((folder) => writeFileSync(join(folder, file), 'other'))).toBe(untouched())
  })
})
