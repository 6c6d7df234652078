import { describe, expect, it } from 'vitest'
import { findLockMismatch, findStalePackage } from '../../../server/launch/packages/lock-check.mjs'

const present = () => true
const lock = {
  packages: {
    '': { dependencies: { pg: '8.0.0' } },
    'node_modules/pg': { version: '8.0.0', integrity: 'sha512-a' },
    'node_modules/only-elsewhere': { version: '1.0.0', integrity: 'sha512-b', optional: true },
    'node_modules/nobodys': { version: '1.0.0', integrity: 'sha512-c', extraneous: true },
  },
}
const pg = { version: '8.0.0', integrity: 'sha512-a' }

describe('what is installed', () => {
  it('agrees with the lock when only optional and unneeded packages are absent', () => {
    const installed = { packages: { 'node_modules/pg': pg } }
    expect(findStalePackage(lock, installed, present)).toBeUndefined()
  })

  it.each([
    ['absent', {}],
    ['of another version', { 'node_modules/pg': { ...pg, version: '8.0.1' } }],
    ['of other content', { 'node_modules/pg': { ...pg, integrity: 'sha512-z' } }],
  ])('is stale when a needed package is %s', (_, packages) => {
    expect(findStalePackage(lock, { packages }, present)).toBe('node_modules/pg')
  })

  it('is stale when a recorded package has lost its folder', () => {
    const installed = { packages: { 'node_modules/pg': pg } }
    expect(findStalePackage(lock, installed, (path) => path !== 'node_modules/pg')).toBe(
      'node_modules/pg',
    )
  })

  it('is stale when it holds a package that the lock no longer names', () => {
    const installed = { packages: { 'node_modules/pg': pg, 'node_modules/old': pg } }
    expect(findStalePackage(lock, installed, present)).toBe('node_modules/old')
  })

  it('is stale when an optional package is there in another version', () => {
    const elsewhere = { version: '0.9.0', integrity: 'sha512-b' }
    const installed = {
      packages: { 'node_modules/pg': pg, 'node_modules/only-elsewhere': elsewhere },
    }
    expect(findStalePackage(lock, installed, present)).toBe('node_modules/only-elsewhere')
  })
})

describe('package.json and its lock', () => {
  it('agree', () => {
    expect(findLockMismatch({ dependencies: { pg: '8.0.0' } }, lock)).toBeUndefined()
  })

  it.each([
    ['adds one', { dependencies: { pg: '8.0.0', zod: '4.0.0' } }, 'zod'],
    ['drops one', {}, 'pg'],
    ['moves one', { dependencies: { pg: '8.0.1' } }, 'pg'],
    ['makes one a tool', { devDependencies: { pg: '8.0.0' } }, 'pg'],
  ])('disagree when package.json %s', (_, manifest, name) => {
    expect(findLockMismatch(manifest, lock)).toBe(name)
  })
})
