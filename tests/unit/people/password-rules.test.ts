import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { COMMON_PASSWORDS } from '#shared/people/common-passwords'
import { passwordProblem } from '#shared/people/password-rules'

const owner = { name: 'Ines Marrowby', email: 'counter.desk@example.com', company: 'Tern Roofs' }

describe('a password', () => {
  it.each([
    ['1234567', 'short'],
    // Seven characters, whatever the machine stores them in.
    ['🔨🔩🔧🪛🪚🧰🪜', 'short'],
    ['🔨🔩🔧🪛🪚🧰🪜🧲', null],
    ['x1'.repeat(101), 'long'],
    ['12345678', 'common'],
    ['aaaaaaaaaa', 'common'],
    ['hgfedcba', 'common'],
    ['PASSWORD123', 'common'],
    ['inesmarrowby', 'personal'],
    ['Marrowby-42', 'personal'],
    ['counterdesk!', 'personal'],
    ['foldyard 99', 'personal'],
    ['marrowby sells no ladders', null],
    ['gutters run to the sea', null],
  ])('%j: %s', (password, problem) => {
    expect(passwordProblem(password, owner)).toBe(problem)
  })

  it('is judged alike in letters of any size and however accents are composed', () => {
    fc.assert(
      fc.property(fc.constantFrom(...COMMON_PASSWORDS), (word) => {
        fc.pre([...word].length >= 8)
        expect(passwordProblem(word.toUpperCase(), owner)).toBe('common')
        expect(passwordProblem(word.normalize('NFD'), owner)).toBe('common')
      }),
    )
  })

  it('is held against a thousand that are tried first', () => {
    const long = [...COMMON_PASSWORDS].filter((word) => [...word].length >= 8)
    expect(long.length).toBeGreaterThan(1000)
  })
})
