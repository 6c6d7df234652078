import { expect, test } from 'vitest'
import { nameMatches } from '@/features/shelf/search-shelf'

test.each([
  ['Barn rake, tall', 'rake', true],
  ['Barn rake, tall', 'TALL barn', true],
  ['Goterón de alero', 'goteron', true],
  ['Goterón de alero', 'goterón  alero', true],
  ['Barn rake, tall', 'ridge', false],
  ['Barn rake, tall', 'barn ridge', false],
  ['Barn rake, tall', '  ', true],
])('%j searched with %j: %s', (name, search, found) => {
  expect(nameMatches(name, search)).toBe(found)
})
