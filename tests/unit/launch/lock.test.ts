import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { findProcess, formatHolder, ownHolder } from '../../../server/launch/process/identity.mjs'
import { takeLock, withLock } from '../../../server/launch/process/lock.mjs'
import { temporaryFolder } from './temporary-folder'

const parentHolder = () =>
  formatHolder({ pid: process.ppid, startTime: findProcess(process.ppid)?.startTime ?? '0' })

describe('the lock', () => {
  it('names its holder and is gone when let go', async () => {
    const file = join(temporaryFolder(), 'deep', 'a.lock')
    const release = await takeLock(file)
    expect(readFileSync(file, 'utf8')).toBe(formatHolder(ownHolder()))
    release()
    expect(existsSync(file)).toBe(false)
  })

  it.each(['4194305-1', `${process.pid}-1`, '', 'rubbish'])(
    'is taken over from a holder that is not there (%j)',
    async (content) => {
      const folder = temporaryFolder({ 'a.lock': content })
      const release = await takeLock(join(folder, 'a.lock'))
      expect(readFileSync(join(folder, 'a.lock'), 'utf8')).toBe(formatHolder(ownHolder()))
      release()
      expect(readdirSync(folder)).toEqual([])
    },
  )

  it('is waited for while its holder lives', async () => {
    const file = join(temporaryFolder({ 'a.lock': parentHolder() }), 'a.lock')
    const seen: number[] = []
    const release = await takeLock(file, (pid) => {
      seen.push(pid)
      rmSync(file)
    })
    expect(seen).toEqual([process.ppid])
    release()
  })

  it('is left alone when somebody else has taken it since', async () => {
    const file = join(temporaryFolder(), 'a.lock')
    const release = await takeLock(file)
    writeFileSync(file, parentHolder())
    release()
    expect(readFileSync(file, 'utf8')).toBe(parentHolder())
  })

  it('is let go when the work fails', async () => {
    const file = join(temporaryFolder(), 'a.lock')
    const work = () => Promise.reject(new Error('no luck'))
    await expect(withLock(file, undefined, work)).rejects.toThrow('no luck')
    expect(existsSync(file)).toBe(false)
  })
})
