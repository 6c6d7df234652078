import { describe, expect, it } from 'vitest'
import { drawDisplayList, placeInBox } from '#server/adapters/pdf/draw-display-list'
import { Pdf } from '#server/adapters/pdf/pdf'
import type { DisplayItem, DisplayList } from '#shared/drawing/display-list'
import { figureColors } from '#shared/drawing/figure-colors'
import { PALETTE } from '#shared/drawing/palette'
import { colorAt, textOfPages, wordsOf } from '../../support/paper'

const COLORS = figureColors('light', '#7A3B2E')
const square = (x: number, y: number, size: number) => [
  { x, y },
  { x: x + size, y },
  { x: x + size, y: y + size },
  { x, y: y + size },
]
const box = { x: 100, y: 50, width: 400, height: 400 }

const draw = async (items: DisplayItem[], at = box, size = { width: 100, height: 100 }) => {
  const list: DisplayList = { ...size, items }
  const pdf = new Pdf({ title: 'Drawing', language: 'en', at: new Date(0) })
  pdf.addPage({ width: 612, height: 792 })
  drawDisplayList(pdf, list, at, { colors: COLORS, alt: 'A square' })
  return pdf.finish()
}

const filled = (role: DisplayItem['role'], x: number, y: number): DisplayItem => ({
  kind: 'path',
  role,
  points: square(x, y, 10),
  closed: true,
  filled: true,
  width: 0,
})

describe('a display list on paper', () => {
  it('is as large as its box allows, in the middle', () => {
    expect(placeInBox({ width: 100, height: 50 }, box)).toEqual({ x: 100, y: 150, scale: 4 })
    expect(placeInBox({ width: 50, height: 100 }, box)).toEqual({ x: 200, y: 50, scale: 4 })
  })

  it('has the colors of the light theme and the real color of the sheet', async () => {
    const bytes = await draw([
      filled('paint', 0, 0),
      filled('metal', 20, 0),
      filled('crease', 40, 0),
      filled('problem', 60, 0),
    ])
    // Middle of each square: four points to a unit.
    expect(await colorAt(bytes, { x: 120, y: 70 })).toBe('#7A3B2E')
    expect(await colorAt(bytes, { x: 200, y: 70 })).toBe(PALETTE.light.ink)
    expect(await colorAt(bytes, { x: 280, y: 70 })).toBe(PALETTE.light.dye)
    expect(await colorAt(bytes, { x: 360, y: 70 })).toBe(PALETTE.light.chalk)
    expect(await colorAt(bytes, { x: 440, y: 70 })).toBe('#FFFFFF')
  })

  it('leaves out what is never seen', async () => {
    const bytes = await draw([filled('target', 0, 0)])
    expect(await colorAt(bytes, { x: 120, y: 70 })).toBe('#FFFFFF')
  })

  it('strokes as wide as the list says, times the scale, and closes what is closed', async () => {
    const outline: DisplayItem = {
      kind: 'path',
      role: 'metal',
      points: square(20, 20, 60),
      closed: true,
      filled: false,
      width: 4,
    }
    const bytes = await draw([outline])
    const left = 100 + 20 * 4
    const middle = 50 + 50 * 4
    expect(await colorAt(bytes, { x: left + 7, y: middle })).toBe(PALETTE.light.ink)
    expect(await colorAt(bytes, { x: left - 7, y: middle })).toBe(PALETTE.light.ink)
    expect(await colorAt(bytes, { x: left + 9, y: middle })).toBe('#FFFFFF')
  })

  it('centers text on its place, turned or not', async () => {
    const text = (content: string, x: number, rotation: number): DisplayItem => ({
      kind: 'text',
      role: 'dimensionText',
      at: { x, y: 50 },
      text: content,
      size: 5,
      rotation,
      bold: false,
    })
    const bytes = await draw([text('5 3/4"', 30, 0), text('90°', 70, -90)])
    const words = await wordsOf(bytes)
    const flat = words.filter(({ text: word }) => word !== '90°')
    const left = Math.min(...flat.map(({ xMin }) => xMin))
    const right = Math.max(...flat.map(({ xMax }) => xMax))
    // Six characters of 0.6 of the size.
    expect(right - left).toBeCloseTo(6 * 0.6 * 5 * 4, 0)
    expect((left + right) / 2).toBeCloseTo(100 + 30 * 4, 0)
    const turned = words.find(({ text: word }) => word === '90°')
    expect(((turned?.yMin ?? 0) + (turned?.yMax ?? 0)) / 2).toBeCloseTo(50 + 50 * 4, 0)
    expect((turned?.yMax ?? 0) - (turned?.yMin ?? 0)).toBeCloseTo(3 * 0.6 * 5 * 4, 0)
  })

  it('of the size of its box is drawn to scale', async () => {
    const bytes = await draw(
      [{ ...filled('metal', 0, 0), points: square(0, 0, 72) } as DisplayItem],
      { x: 36, y: 36, width: 100, height: 100 },
    )
    expect(await colorAt(bytes, { x: 107.5, y: 40 })).toBe(PALETTE.light.ink)
    expect(await colorAt(bytes, { x: 108.5, y: 40 })).toBe('#FFFFFF')
  })

  it('is told in words to who cannot see it', async () => {
    const bytes = await draw([filled('metal', 0, 0)])
    expect(Buffer.from(bytes).toString('latin1')).toContain('/Alt (A square)')
    expect(await textOfPages(bytes)).toEqual([''])
  })
})
