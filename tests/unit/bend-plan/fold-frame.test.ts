import { describe, expect, test } from 'vitest'
import { chainOf } from '#shared/bend-plan/fold-frame'
import { gaugeDistance, restsOn } from '#shared/bend-plan/gauge-stop'
import { workpieceOf } from '#shared/bend-plan/workpiece'
import { hem, section } from '../../support/bend-plan-cases'

const T = 0.024
const points = (chain: ReturnType<typeof chainOf>) =>
  chain.points.map(({ x, y }) => [Math.round(x * 1e6) / 1e6 + 0, Math.round(y * 1e6) / 1e6 + 0])

const bendOf = (piece: ReturnType<typeof workpieceOf>, index: number) => {
  const bend = piece.bends[index]
  if (bend === undefined) throw new Error(`No bend ${index}`)
  return bend
}

describe('chains of the fold frame', () => {
  const piece = workpieceOf(section([1, 2, 3, 4], [90, 90, -90]), T)
  const second = bendOf(piece, 1)

  test('unmade bends make no corner', () => {
    expect(points(chainOf(piece, second, 'B', 0, 'front'))).toEqual([
      [0, 0],
      [7, 0],
    ])
    expect(points(chainOf(piece, second, 'A', 0, 'rear'))).toEqual([
      [0, 0],
      [-3, 0],
    ])
  })

  test('a made bend of the same sign turns the front up and the rear up', () => {
    expect(points(chainOf(piece, second, 'A', 0b001, 'front'))).toEqual([
      [0, 0],
      [2, 0],
      [2, 1],
    ])
    expect(points(chainOf(piece, second, 'A', 0b001, 'rear'))).toEqual([
      [0, 0],
      [-2, 0],
      [-2, 1],
    ])
  })

  test('a made bend of the other sign turns both down', () => {
    expect(points(chainOf(piece, second, 'B', 0b100, 'front'))).toEqual([
      [0, 0],
      [3, 0],
      [3, -4],
    ])
    expect(points(chainOf(piece, second, 'B', 0b100, 'rear'))).toEqual([
      [0, 0],
      [-3, 0],
      [-3, -4],
    ])
  })

  test('developed width counts every leg and lip, first run only to the first made bend', () => {
    const chain = chainOf(piece, second, 'B', 0b100, 'front')
    expect([chain.developed, chain.firstRun]).toEqual([7, 3])
  })

  test('a bend of no turn merges its legs and keeps the numbers of the others', () => {
    const merged = workpieceOf(section([1, 2, 3], [1e-7, 90]), T)
    expect(merged.legs).toEqual([3, 3])
    expect(merged.bends.map((bend) => bend.fold)).toEqual([2])
  })

  test('turns and legs that do not match are refused', () => {
    expect(() => workpieceOf(section([1, 2], []), T)).toThrow(RangeError)
    const long = section(Array<number>(28).fill(1), Array<number>(27).fill(90))
    expect(() => workpieceOf(long, T)).toThrow(/27 bends/)
  })
})

describe('hems in the fold frame', () => {
  const closed = workpieceOf(section([4, 3], [90], { B: hem(1) }), T)
  const open = workpieceOf(section([4, 3], [90], { B: hem(1, 0.5, 0.25) }), T)

  test('unmade, a hem lies flat as its lip', () => {
    expect(points(chainOf(closed, bendOf(closed, 0), 'B', 0, 'front'))).toEqual([
      [0, 0],
      [3.5, 0],
    ])
  })

  test('made, a closed hem is flat sheet and an open one is real', () => {
    expect(points(chainOf(closed, bendOf(closed, 0), 'B', 0b10, 'front'))).toEqual([
      [0, 0],
      [3, 0],
    ])
    expect(points(chainOf(open, bendOf(open, 0), 'B', 0b10, 'front'))).toEqual([
      [0, 0],
      [3, 0],
      [3, 0.274],
      [2.5, 0.274],
    ])
  })

  test('the gap never counts towards a developed width', () => {
    expect(open.width).toBe(7.5)
    expect(chainOf(open, bendOf(open, 0), 'B', 0b10, 'front').developed).toBe(3.5)
  })
})

describe('gauge', () => {
  const piece = workpieceOf(section([1, 2, 3, 4], [90, 90, -90], { A: hem(1) }), T)

  test('rests on what lies behind', () => {
    const third = bendOf(piece, 3)
    expect(restsOn(piece, third, 'A', 0)).toBe('rawEdge')
    expect(restsOn(piece, third, 'A', 0b0001)).toBe('hem')
    expect(restsOn(piece, third, 'A', 0b0101)).toBe('formedFace')
    expect(restsOn(piece, third, 'B', 0b0101)).toBe('rawEdge')
    const open = workpieceOf(section([1, 2], [90], { A: hem(1, 0.5, 0.25) }), T)
    expect(restsOn(open, bendOf(open, 1), 'A', 0b01)).toBe('formedFace')
  })

  test('reaches only half an inch above and below the sheet', () => {
    // Rear: 2 back, then out and up at 45: the stop meets it half an inch up, half an inch further.
    const kicked = workpieceOf(section([3, 2, 4], [-45, -90]), T)
    const chain = chainOf(kicked, bendOf(kicked, 1), 'A', 0b01, 'rear')
    expect(gaugeDistance(chain)).toBeCloseTo(2.5, 12)
  })

  test('a face exactly at the end of the stop counts, whatever a sine rounds to', () => {
    const stepped = workpieceOf(section([2, 0.5, 3, 4], [-90, 90, 45]), T)
    const chain = chainOf(stepped, bendOf(stepped, 2), 'A', 0b011, 'rear')
    expect(chain.points.map(({ y }) => Math.abs(y) <= 0.5)).toContain(false)
    expect(gaugeDistance(chain)).toBeCloseTo(5, 12)
  })
})
