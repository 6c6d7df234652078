import { describe, expect, it } from 'vitest'
import type { Candidate } from '#shared/drawing/placement'
import { later, placeLabels, streamOf } from '#shared/drawing/placement'

/** A text of 20 by 10 in the middle of (x, y). */
const textAt = (x: number, y: number) => [x - 10, y - 5, x + 10, y + 5]

const at = (x: number, cost: number): Candidate => ({ boxes: textAt(x, 0), lines: [], cost })

const label = (weight: number, candidates: readonly Candidate[]) => ({
  weight,
  streams: [streamOf(candidates)],
})

describe('placing labels', () => {
  it('takes the cheapest place where nothing is in the way', () => {
    const best = at(0, 0)
    expect(placeLabels([label(1, [at(50, 2), best])])).toEqual([best])
  })

  it('moves the lighter label aside when both want the same place', () => {
    const wanted = at(0, 0)
    const aside = at(60, 5)
    const labels = [label(1, [wanted, aside]), label(9, [wanted])]
    expect(placeLabels(labels)).toEqual([aside, wanted])
  })

  it('leaves the lighter label out when there is one place for two', () => {
    const wanted = at(0, 0)
    const labels = [label(1, [wanted]), label(9, [wanted])]
    expect(placeLabels(labels)).toEqual([undefined, wanted])
  })

  it('keeps texts on one line far enough apart to be read as two', () => {
    const beside = at(23, 0)
    const apart = at(50, 1)
    const labels = [label(9, [at(0, 0)]), label(1, [beside, apart])]
    expect(placeLabels(labels)[1]).toBe(apart)
  })

  it('keeps text off the lines of other labels, and lines from crossing where it can', () => {
    const crossing = {
      boxes: textAt(0, 60),
      lines: [-40, 30, 40, 30],
      cost: 0,
    }
    const clear = { ...crossing, lines: [], cost: 1 }
    const upright = {
      boxes: textAt(0, 0),
      lines: [0, 8, 0, 45],
      cost: 0,
    }
    const labels = [label(9, [upright]), label(1, [crossing, clear])]
    expect(placeLabels(labels)[1]).toBe(clear)
  })

  it('moves a label that could stay, if that makes room for one that has no other place', () => {
    const wanted = at(0, 0)
    const far = at(300, 9)
    const heavy = label(9, [wanted, far])
    expect(placeLabels([heavy, label(1, [at(2, 0)])])).toEqual([far, at(2, 0)])
  })

  it('asks for dear candidates only when the cheap ones do not do', () => {
    let begun = 0
    const begin = (candidates: readonly Candidate[]) =>
      later(5, () => {
        begun += 1
        return [streamOf(candidates)]
      })
    const cheap = { weight: 1, streams: [streamOf([at(0, 1)]), begin([at(60, 5)])] }
    placeLabels([cheap])
    expect(begun).toBe(0)
    const blocked = { weight: 1, streams: [streamOf([at(0, 1)]), begin([at(60, 5)])] }
    expect(placeLabels([label(9, [at(0, 0)]), blocked])[1]).toEqual(at(60, 5))
    expect(begun).toBe(1)
  })
})
