import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { findProcess, formatHolder, ownHolder } from '../../../server/launch/process/identity.mjs'
import { addLease, dropLease } from '../../../server/launch/process/leases.mjs'
import { temporaryFolder } from './temporary-folder'

describe('leases', () => {
  it('are named after their user', () => {
    const folder = temporaryFolder()
    addLease(folder)
    expect(readdirSync(folder)).toEqual([formatHolder(ownHolder())])
  })

  it('leave nobody when the only user goes', () => {
    const folder = temporaryFolder()
    addLease(folder)
    expect(dropLease(folder)).toBe(0)
    expect(readdirSync(folder)).toEqual([])
  })

  it('of dead users do not count and are removed; those of living ones stay', () => {
    const living = formatHolder({
      pid: process.ppid,
      startTime: findProcess(process.ppid)?.startTime ?? '0',
    })
    const folder = temporaryFolder({ '4194305-1': '', 'not a lease': '', [living]: '' })
    addLease(folder)
    expect(dropLease(folder)).toBe(1)
    expect(readdirSync(folder)).toEqual([living])
  })
})
