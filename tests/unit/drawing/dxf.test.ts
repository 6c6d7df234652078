import DxfParser, { type IDxf, type ILineEntity, type IPolylineEntity } from 'dxf-parser'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { creaseSpans } from '#shared/drawing/crease-spans'
import { DXF_LAYERS, toDxf } from '#shared/drawing/dxf'
import { layStrip } from '#shared/ends/lay-strip'
import type { PieceToLay } from '#shared/ends/strip-borders'
import type { Sheet } from '#shared/stock/stock.schema'
import { flatStrip } from '#shared/strip/flat-strip'
import { foldedSection } from '#shared/strip/folded-section'
import { dressedArbitrary } from '../../support/arbitrary-end'
import { profileOf } from '../../support/arbitrary-profile'

const STEEL: Sheet = {
  metal: 'steel',
  thickness: 0.0276,
  insideRadius: 0.0394,
  kFactor: 0.408,
  density: 0.2836,
  springbackPer90: 0.9,
}

interface Read {
  readonly text: string
  readonly file: IDxf
  readonly piece: PieceToLay
}

/** Written by us, read by an independent reader; undefined where the ends cannot be cut. */
const writeAndRead = (piece: PieceToLay): Read | undefined => {
  const laid = layStrip(piece)
  if (!laid.ok) return undefined
  const strip = flatStrip(piece.profile, piece.sheet)
  const section = foldedSection(piece.profile, { ...STEEL, ...piece.sheet })
  const text = toDxf({ layout: laid.layout, strip, section })
  const file = new DxfParser().parseSync(text)
  if (file === null) throw new Error('The reader found no drawing.')
  return { text, file, piece }
}

const onLayer = <Entity>(file: IDxf, layer: string): Entity[] =>
  file.entities.filter((entity) => entity.layer === layer) as unknown as Entity[]

const only = <Entity>(entities: readonly Entity[]): Entity => {
  const [first, ...rest] = entities
  if (first === undefined || rest.length > 0) throw new Error(`${entities.length} instead of one.`)
  return first
}

const gable: PieceToLay = {
  profile: {
    ...profileOf([4, 3, 0.75], [-90, 45]),
    hemB: { style: 'closed', length: 0.5, turn: -1 },
  },
  sheet: STEEL,
  pieceLength: 96,
  ends: {
    left: { kind: 'square', tabs: [{ leg: 2, length: 1 }] },
    right: { kind: 'miter', plane: { plumb: 20 }, lay: 0, legs: [], tabs: [] },
    lowEnd: 'left',
  },
}

const read = (piece: PieceToLay): Read => {
  const result = writeAndRead(piece)
  if (result === undefined) throw new Error('This piece can be laid out.')
  return result
}

describe('a strip as DXF, read back by an independent reader', () => {
  const { file, text, piece } = read(gable)
  const laid = layStrip(piece)
  if (!laid.ok) throw new Error('This piece can be laid out.')
  const { layout } = laid

  it('is a drawing in inches of release 12, with its layers', () => {
    expect(file.header).toMatchObject({ $ACADVER: 'AC1009', $INSUNITS: 1 })
    expect(Object.keys(file.tables?.layer?.layers ?? {})).toEqual([...DXF_LAYERS])
    const used = new Set(file.entities.map(({ layer }) => layer))
    expect([...used].filter((layer) => !DXF_LAYERS.some((known) => known === layer))).toEqual([])
  })

  it('has a crease a bend and hem, up, down or hem, from cut to cut', () => {
    const places = (layer: string) =>
      onLayer<ILineEntity>(file, layer).map(({ vertices }) => vertices[0]?.y)
    const strip = flatStrip(piece.profile, piece.sheet)
    const [first, second, third] = strip.creases.map(({ at }) => Number(at.toFixed(8)))
    expect(places('CREASE-DOWN')).toEqual([first])
    expect(places('CREASE-UP')).toEqual([second])
    expect(places('HEM')).toEqual([third])
    const down = only(onLayer<ILineEntity>(file, 'CREASE-DOWN'))
    expect(down.vertices[0]?.x).toBeCloseTo(layout.left.marks[1]?.along ?? NaN, 6)
    expect(down.vertices[1]?.x).toBeCloseTo(
      layout.blankLength - (layout.right.marks[1]?.along ?? NaN),
      6,
    )
  })

  it('folds the tab on its line', () => {
    const fold = only(onLayer<ILineEntity>(file, 'TAB-FOLD'))
    expect(fold.vertices.map(({ x }) => x)).toEqual([1, 1])
  })

  it('writes degrees of bend beside each crease, and nothing a person typed', () => {
    expect(text).toContain('\n90 down\n')
    expect(text).toContain('\n45 up\n')
    expect(text).toContain('\nhem down\n')
  })
})

it('has a closed outline and a closed section, to a millionth of an inch, for any dressed strip', () => {
  let seen = 0
  fc.assert(
    fc.property(dressedArbitrary, (piece) => {
      const result = writeAndRead(piece)
      const laid = layStrip(piece)
      if (!result || !laid.ok) return
      seen += 1
      const outline = only(onLayer<IPolylineEntity>(result.file, 'OUTLINE'))
      expect(outline.shape).toBe(true)
      expect(outline.vertices).toHaveLength(laid.layout.outline.length)
      outline.vertices.forEach(({ x, y }, index) => {
        expect(Math.abs(x - (laid.layout.outline[index]?.along ?? NaN))).toBeLessThan(1e-6)
        expect(Math.abs(y - (laid.layout.outline[index]?.at ?? NaN))).toBeLessThan(1e-6)
      })
      const creases = ['CREASE-UP', 'CREASE-DOWN', 'HEM'].flatMap((layer) =>
        onLayer<ILineEntity>(result.file, layer),
      )
      const spans = flatStrip(piece.profile, piece.sheet).creases.flatMap(({ at }) =>
        creaseSpans(laid.layout.outline, at).map(({ from, to }) => [from, at, to, at]),
      )
      const sorted = (lines: number[][]) =>
        lines.toSorted((a, b) => (a[1] ?? 0) - (b[1] ?? 0) || (a[0] ?? 0) - (b[0] ?? 0))
      const read = sorted(creases.map(({ vertices }) => vertices.flatMap(({ x, y }) => [x, y])))
      expect(read).toHaveLength(spans.length)
      sorted(spans).forEach((span, index) => {
        span.forEach((value, which) => {
          expect(Math.abs(value - (read[index]?.[which] ?? NaN))).toBeLessThan(1e-6)
        })
      })
      const section = only(onLayer<IPolylineEntity>(result.file, 'SECTION'))
      expect(section.shape).toBe(true)
      const left = Math.min(...section.vertices.map(({ x }) => x))
      expect(left).toBeGreaterThan(laid.layout.blankLength)
    }),
    { seed: 20_260_801, numRuns: 150 },
  )
  expect(seen).toBeGreaterThan(50)
})
