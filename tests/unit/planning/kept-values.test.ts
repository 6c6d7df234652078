import { describe, expect, it } from 'vitest'
import { KeptValues } from '#server/planning/kept-values'

function keep(most: number) {
  const kept = new KeptValues<{ readonly key: string }>(most)
  const made: string[] = []
  const ask = (key: string) =>
    kept.getOrMake(key, () => {
      made.push(key)
      return { key }
    })
  return { ask, made }
}

describe('Kept values', () => {
  it('are made once for as long as they are kept', () => {
    const { ask, made } = keep(2)
    expect(ask('a')).toBe(ask('a'))
    expect(made).toEqual(['a'])
  })

  it('give way in the order in which they were last asked for', () => {
    const { ask, made } = keep(2)
    ask('a')
    ask('b')
    ask('a')
    ask('c')
    ask('a')
    ask('b')
    expect(made).toEqual(['a', 'b', 'c', 'b'])
  })

  it('do not keep what could not be made', () => {
    const kept = new KeptValues(2)
    const fail = () => {
      throw new RangeError('no')
    }
    expect(() => kept.getOrMake('a', fail)).toThrow(RangeError)
    const made = {}
    expect(kept.getOrMake('a', () => made)).toBe(made)
  })
})
