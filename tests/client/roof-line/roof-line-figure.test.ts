import { describe, expect, test } from 'vitest'
import type { TextShape } from '#shared/drawing/display-list'
import { textWidth } from '#shared/drawing/text-box'
import { roofLineSchema } from '#shared/roof-line/roof-line.schema'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import { roofLineFigure } from '@/features/roof-line/model/roof-line-figure'

const WIDTH = 358

function draw(length: number, extra = 0) {
  const line = roofLineSchema.parse({
    length,
    pieceLength: 120,
    lap: 4,
    mode: 'full',
    leftExtra: extra,
    rightExtra: extra,
  })
  const found = roofPieces(line)
  if (!found.ok) throw new Error('The line has an answer.')
  const figure = roofLineFigure(found.answer, WIDTH, { length: (inches) => `${inches}"` })
  return { answer: found.answer, figure }
}

const texts = (length: number): TextShape[] =>
  draw(length).figure.items.filter((item) => item.kind === 'text')

describe('the picture of a roof line', () => {
  test('has a bar for each piece and one for each lap', () => {
    const { answer, figure } = draw(348)
    const bars = (role: string) => figure.items.filter((item) => item.role === role)
    expect(bars('metal')).toHaveLength(answer.order.length)
    expect(bars('selected')).toHaveLength(answer.laps.length)
  })

  test('says lengths above and where each lap begins below', () => {
    const shown = texts(348).map(({ text }) => text)
    expect(shown).toEqual(expect.arrayContaining(['120"', '116"', '0"', '348"', '232"']))
  })

  test('lies inside its frame, with what the ends add', () => {
    for (const { points } of draw(348, 12).figure.items.filter((item) => item.kind === 'path')) {
      for (const { x } of points) {
        expect(x).toBeGreaterThanOrEqual(0)
        expect(x).toBeLessThanOrEqual(WIDTH)
      }
    }
  })

  test.each([100, 348, 2400, 6000])('no text of a line of %d in. touches another', (length) => {
    const all = texts(length)
    for (const height of new Set(all.map(({ at }) => at.y))) {
      const spans = all
        .filter(({ at }) => at.y === height)
        .map(({ at, text, size }) => [
          at.x - textWidth(text, size) / 2,
          at.x + textWidth(text, size) / 2,
        ])
        .toSorted(([a = 0], [b = 0]) => a - b)
      spans.slice(1).forEach(([from = NaN], index) => {
        expect(from).toBeGreaterThan(spans[index]?.[1] ?? NaN)
      })
    }
  })
})
