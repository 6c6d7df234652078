import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getStarter, STARTERS } from '#shared/profile/starters'
import { parseParameters, printParameters } from '@/features/shelf/starter/starter-address'
import { soundValues } from '@/features/shelf/starter/useStarterValues'

describe('what is set of a starter, in an address', () => {
  it.each(STARTERS)('$key: is read as it was written', (starter) => {
    const values = fc.tuple(
      ...starter.parameters.map(({ key, least, most }) =>
        fc.double({ min: least, max: most, noNaN: true }).map((value) => [key, value] as const),
      ),
    )
    fc.assert(
      fc.property(values, (pairs) => {
        const text = printParameters(starter, Object.fromEntries(pairs))
        const changed = pairs.filter(
          ([key, value]) =>
            value !== starter.parameters.find((parameter) => parameter.key === key)?.default,
        )
        expect(text === undefined ? {} : parseParameters(starter, text)).toEqual(
          Object.fromEntries(changed),
        )
      }),
    )
  })

  it('says nothing where all has its default', () => {
    expect(printParameters(getStarter('headwall'), { wallHeight: 3.5 })).toBeUndefined()
  })

  it.each(['', 'wallHeight:1', 'wallHeight:x', 'wallHeight:3:4,', 'faceWidth:3'])(
    'is refused as a whole: %j',
    (text) => expect(parseParameters(getStarter('headwall'), text)).toBeNull(),
  )
})

describe('what is entered of a starter', () => {
  const starter = getStarter('coping')

  it('is taken once all of it can be', () => {
    expect(soundValues(starter, {})).toEqual({})
    expect(soundValues(starter, { wallWidth: 8 })).toEqual({ wallWidth: 8 })
    expect(soundValues(starter, { wallWidth: 8, faceWidth: null })).toBeNull()
    expect(soundValues(starter, { wallWidth: 30 })).toBeNull()
  })
})
