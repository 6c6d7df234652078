import { describe, expect, it } from 'vitest'
import { KeptValues } from '#server/planning/kept-values'

const value = (name: string) => ({ name })

describe('Kept values', () => {
  it('are found as they were kept, and nothing else is', () => {
    const kept = new KeptValues<{ readonly name: string }>(2)
    const first = value('first')
    kept.keep('a', first)
    expect(kept.find('a')).toBe(first)
    expect(kept.find('b')).toBeUndefined()
  })

  it('give way to a newer one of the same key', () => {
    const kept = new KeptValues<{ readonly name: string }>(2)
    kept.keep('a', value('old'))
    kept.keep('a', value('new'))
    expect(kept.find('a')).toEqual(value('new'))
  })

  it('give way in the order in which they were last asked for', () => {
    const kept = new KeptValues<{ readonly name: string }>(2)
    kept.keep('a', value('a'))
    kept.keep('b', value('b'))
    kept.find('a')
    kept.keep('c', value('c'))
    expect(['a', 'b', 'c'].map((key) => kept.find(key)?.name)).toEqual(['a', undefined, 'c'])
  })
})
