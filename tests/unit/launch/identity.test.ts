import { describe, expect, it } from 'vitest'
import {
  findProcess,
  formatHolder,
  isAlive,
  ownHolder,
  parseHolder,
  parseStat,
} from '../../../server/launch/process/identity.mjs'

const stat = (name: string, state: string) =>
  `412 (${name}) ${state} 1 412 412 0 -1 4194304 102 0 0 0 7 3 0 0 20 0 1 0 23882 3133440 411 0`

describe('a process in /proc', () => {
  it('is read by name, state and start time', () => {
    expect(parseStat(stat('postgres', 'S'))).toEqual({
      name: 'postgres',
      state: 'S',
      startTime: '23882',
    })
  })

  it('may have brackets and blanks in its name', () => {
    expect(parseStat(stat('a (b) c', 'R'))).toEqual({
      name: 'a (b) c',
      state: 'R',
      startTime: '23882',
    })
  })

  it.each(['', '412 postgres S 1', '412 (postgres) S 1 2'])('is not read from %j', (text) => {
    expect(parseStat(text)).toBeUndefined()
  })
})

describe('a holder', () => {
  it('is the same after being written and read', () => {
    expect(parseHolder(`${formatHolder(ownHolder())}\n`)).toEqual(ownHolder())
  })

  it.each(['', '12', '12-', 'x-1', '12-3-4', '12 3'])('is not read from %j', (text) => {
    expect(parseHolder(text)).toBeUndefined()
  })

  it('lives while its process does', () => {
    expect(isAlive(ownHolder())).toBe(true)
  })

  it('is dead when a later process has its number', () => {
    expect(isAlive({ pid: process.pid, startTime: '1' })).toBe(false)
  })

  it('is dead when no process has its number', () => {
    // Above the largest number that Linux gives.
    expect(findProcess(2 ** 22 + 1)).toBeUndefined()
    expect(isAlive({ pid: 2 ** 22 + 1, startTime: '1' })).toBe(false)
  })
})
