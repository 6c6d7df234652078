import { describe, expect, it } from 'vitest'
import type { Candidate } from '#shared/drawing/placement'
import { placeLabels } from '#shared/drawing/placement'
import { boxAround } from '#shared/geometry/bounds'
import { segment } from '#shared/geometry/segment'

const at = (x: number, cost: number): Candidate => ({
  boxes: [boxAround({ x, y: 0 }, 20, 10)],
  lines: [],
  cost,
})

describe('placing labels', () => {
  it('takes the cheapest place where nothing is in the way', () => {
    const best = at(0, 0)
    expect(placeLabels([{ weight: 1, candidates: [at(50, 2), best] }])).toEqual([best])
  })

  it('moves the lighter label aside when both want the same place', () => {
    const wanted = at(0, 0)
    const aside = at(60, 5)
    const light = { weight: 1, candidates: [wanted, aside] }
    const heavy = { weight: 9, candidates: [wanted] }
    expect(placeLabels([light, heavy])).toEqual([aside, wanted])
  })

  it('leaves the lighter label out when there is one place for two', () => {
    const wanted = at(0, 0)
    const labels = [
      { weight: 1, candidates: [wanted] },
      { weight: 9, candidates: [wanted] },
    ]
    expect(placeLabels(labels)).toEqual([undefined, wanted])
  })

  it('keeps texts on one line far enough apart to be read as two', () => {
    const beside = at(23, 0)
    const apart = at(50, 1)
    const labels = [
      { weight: 9, candidates: [at(0, 0)] },
      { weight: 1, candidates: [beside, apart] },
    ]
    expect(placeLabels(labels)[1]).toBe(apart)
  })

  it('keeps text off the lines of other labels, and lines from crossing where it can', () => {
    const crossing = {
      boxes: [boxAround({ x: 0, y: 60 }, 20, 10)],
      lines: [segment({ x: -40, y: 30 }, { x: 40, y: 30 })],
      cost: 0,
    }
    const clear = { ...crossing, lines: [], cost: 1 }
    const upright = {
      boxes: [boxAround({ x: 0, y: 0 }, 20, 10)],
      lines: [segment({ x: 0, y: 8 }, { x: 0, y: 45 })],
      cost: 0,
    }
    const labels = [
      { weight: 9, candidates: [upright] },
      { weight: 1, candidates: [crossing, clear] },
    ]
    expect(placeLabels(labels)[1]).toBe(clear)
  })
})
