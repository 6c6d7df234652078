import { describe, expect, it } from 'vitest'
import type { HandOffSheet } from '#shared/hand-off/hand-off.contract'
import { handOverStep, leftBehind, type HandOverForm } from '@/features/hand-off/hand-over'
import { scanOutcome, takeScan } from '@/features/hand-off/scan-outcome'
import { bundleCode, bundleOf, orderSummaryOf, pieceCode, sheetOf } from './counter-data'

const GONE = { pickedUpAt: '2026-03-04T13:42:00.000Z' }
const LINE: HandOverForm['signature'] = [
  [
    [0, 0],
    [100, 100],
  ],
]
const form = (more: Partial<HandOverForm> = {}): HandOverForm => ({
  scanned: [],
  receivedBy: '',
  signature: [],
  signedOnPaper: false,
  ...more,
})

describe('what the one button waits for', () => {
  it.each<{ what: string; sheet: HandOffSheet; form: HandOverForm; waitsFor: string }>([
    { what: 'no bundle yet', sheet: sheetOf({ bundles: [] }), form: form(), waitsFor: 'bundles' },
    {
      what: 'all of them gone',
      sheet: sheetOf({ bundles: [bundleOf(1, GONE)] }),
      form: form({ scanned: [bundleCode(1)], receivedBy: 'Joss', signature: LINE }),
      waitsFor: 'bundles',
    },
    { what: 'nothing scanned', sheet: sheetOf(), form: form(), waitsFor: 'scan' },
    {
      what: 'the scanned one went meanwhile',
      sheet: sheetOf({ bundles: [bundleOf(1, GONE), bundleOf(2)] }),
      form: form({ scanned: [bundleCode(1)], receivedBy: 'Joss', signature: LINE }),
      waitsFor: 'scan',
    },
    {
      what: 'no name',
      sheet: sheetOf(),
      form: form({ scanned: [bundleCode(1)], receivedBy: '  ', signature: LINE }),
      waitsFor: 'name',
    },
    {
      what: 'a tap is no signature',
      sheet: sheetOf(),
      form: form({ scanned: [bundleCode(1)], receivedBy: 'Joss', signature: [[[5, 5]]] }),
      waitsFor: 'signature',
    },
    {
      what: 'signed',
      sheet: sheetOf(),
      form: form({ scanned: [bundleCode(1)], receivedBy: 'Joss', signature: LINE }),
      waitsFor: 'nothing',
    },
    {
      what: 'signed on paper',
      sheet: sheetOf(),
      form: form({ scanned: [bundleCode(1)], receivedBy: 'Joss', signedOnPaper: true }),
      waitsFor: 'nothing',
    },
  ])('$what: $waitsFor', ({ sheet, form: given, waitsFor }) => {
    expect(handOverStep(sheet, given).waitsFor).toBe(waitsFor)
  })

  it('names the bundle when one alone is left', () => {
    const sheet = sheetOf({ bundles: [bundleOf(1, GONE), bundleOf(2, GONE), bundleOf(3)] })
    expect(handOverStep(sheet, form())).toMatchObject({ only: { number: 3 } })
    expect(handOverStep(sheetOf(), form())).toMatchObject({ only: null })
  })

  it('hands over what is scanned and still here, in the order of the sheet', () => {
    const sheet = sheetOf({ bundles: [bundleOf(1), bundleOf(2, GONE), bundleOf(3)] })
    const scanned = [bundleCode(3), bundleCode(2), bundleCode(1)]
    expect(handOverStep(sheet, form({ scanned, receivedBy: 'Joss', signature: LINE }))).toEqual({
      waitsFor: 'nothing',
      bundleCodes: [bundleCode(1), bundleCode(3)],
    })
  })
})

describe('what stays behind', () => {
  const missing = sheetOf({
    looseCount: 2,
    order: orderSummaryOf({
      state: 'inWork',
      progress: { queued: 4, bent: 2, bundled: 6, pickedUp: 0, scrapped: 0, withdrawn: 0 },
    }),
  })

  it('names the bundles that were not scanned, and the pieces that are in none', () => {
    const left = leftBehind(missing, [bundleCode(1)])
    expect(left.bundles.map(({ number }) => number)).toEqual([2, 3])
    expect(left).toMatchObject({ loose: 2, queued: 4, some: true })
  })

  it('names no bundle before the first scan', () => {
    expect(leftBehind(sheetOf(), [])).toMatchObject({ bundles: [], some: false })
  })

  it('is nothing when all of it goes', () => {
    expect(leftBehind(sheetOf(), [1, 2, 3].map(bundleCode)).some).toBe(false)
  })
})

describe('a scanned code', () => {
  const sheet = sheetOf({ bundles: [bundleOf(1), bundleOf(2, GONE)] })

  it.each([
    { what: 'a bundle', code: bundleCode(1), scanned: [], kind: 'scanned' },
    { what: 'a piece in it', code: pieceCode(12), scanned: [], kind: 'scanned' },
    { what: 'the same again', code: bundleCode(1), scanned: [bundleCode(1)], kind: 'again' },
    { what: 'one that is out', code: bundleCode(2), scanned: [], kind: 'gone' },
  ])('$what: $kind', ({ code, scanned, kind }) => {
    expect(scanOutcome(sheet, scanned, code)?.kind).toBe(kind)
  })

  it('of another order is not on the sheet', () => {
    expect(scanOutcome(sheet, [], bundleCode(9))).toBeNull()
  })
})

describe('a label scanned while a name is being typed', () => {
  it('is taken out of the name', () => {
    expect(takeScan(`Joss Marlow, truck 4${bundleCode(2)}`)).toEqual({
      code: bundleCode(2),
      rest: 'Joss Marlow, truck 4',
    })
  })

  it.each(['Joss Marlow, truck 4', 'Joss', '', 'PELLASTERS', bundleCode(2).toLowerCase()])(
    'is not seen in "%s"',
    (text) => {
      expect(takeScan(text)).toBeUndefined()
    },
  )
})
