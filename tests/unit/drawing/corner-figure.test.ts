import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import type { Face } from '#shared/drawing/axonometry'
import { faceOf, paintersOrder, project, viewFrom } from '#shared/drawing/axonometry'
import { cornerFigure } from '#shared/drawing/corner-figure'
import type { DisplayList, PathShape } from '#shared/drawing/display-list'
import { closeEnds } from '#shared/ends/close-ends'
import type { Corner, End } from '#shared/ends/end.schema'
import { endSchema, sideSchema } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { matchingLay } from '#shared/ends/run-frame'
import { add3, cross3, dot3, scale3, subtract3, unit3, vector3 } from '#shared/geometry/vector3'
import { holds } from '#shared/geometry/bounds'
import { profileSchema } from '#shared/profile/profile.schema'
import { profileOf } from '../../support/arbitrary-profile'
import { frameArbitrary } from './arbitrary-frame'
import { extentOf } from './figure-faults'

const sheet = { thickness: 0.0276, insideRadius: 0.0394, kFactor: 0.408 }
const gable = {
  ...profileOf([5, 6, 0.75], [-90, 45]),
  hemB: { style: 'closed', length: 0.5, turn: -1 },
} as const

const SIZE = { width: 420, height: 300, names: ['A', 'B'] } as const

const mitered = (corner: Corner, lay: number): End => ({
  kind: 'miter',
  plane: { corner },
  lay,
  legs: [],
  tabs: [],
})

const cornerOf = (a: EndOfPiece, b: EndOfPiece, names: readonly [string, string] = ['A', 'B']) => {
  const closed = closeEnds(a, b)
  if (!closed.ok) throw new Error(closed.code)
  return { closed, figure: cornerFigure(a, { piece: b, closed }, { ...SIZE, names }) }
}

const paths = ({ items }: DisplayList, role: string): PathShape[] =>
  items.filter((item): item is PathShape => item.kind === 'path' && item.role === role)

describe('the picture of a corner', () => {
  const slopes = { slopeIn: 14, slopeOut: 0, plan: 90 }
  const entering = { profile: gable, sheet, end: mitered(slopes, 0), side: 'right' } as const
  const matching = mitered(slopes, matchingLay(slopes, 'right', 0))
  const leaving = { ...entering, end: matching, side: 'left' } as const

  it('draws every cut as metal where the pieces close', () => {
    const { closed, figure } = cornerOf(entering, leaving)
    expect(closed.closes).toBe(true)
    expect(paths(figure, 'problem')).toEqual([])
    // Three legs and the hem's lip of either piece.
    expect(paths(figure, 'metal')).toHaveLength(8)
    expect(paths(figure, 'paint').length + paths(figure, 'bare').length).toBe(8)
  })

  it('draws the cut of a leg that closes on none as a problem', () => {
    const tilted = {
      ...leaving,
      end: mitered(slopes, matching.kind === 'miter' ? matching.lay + 20 : 0),
    }
    const { closed, figure } = cornerOf(entering, tilted)
    const open = [...closed.a, ...closed.b].filter(({ closesOn }) => closesOn === null)
    expect(open.length).toBeGreaterThan(0)
    expect(paths(figure, 'problem')).toHaveLength(open.length)
  })

  it('shows the painted side, and turns with the eye', () => {
    const alone = cornerFigure(entering, null, SIZE)
    expect(paths(alone, 'paint').length).toBeGreaterThan(paths(alone, 'bare').length)
    const behind = cornerFigure(entering, null, { ...SIZE, turn: 180 })
    expect(paths(behind, 'bare').length).toBeGreaterThan(paths(alone, 'bare').length)
  })

  it('names both pieces where there is room, within the frame', () => {
    const { figure } = cornerOf(entering, leaving, ['A gable', 'B high side'])
    const texts = figure.items.flatMap((item) => (item.kind === 'text' ? [item.text] : []))
    expect(texts).toEqual(['A gable', 'B high side'])
  })

  it('stays in its frame at any size, names or no names', () => {
    fc.assert(
      fc.property(frameArbitrary, fc.integer({ min: 0, max: 359 }), (frame, turn) => {
        const { closed } = cornerOf(entering, leaving)
        const names = ['A gable', 'B high side'] as const
        const options = { ...frame, names, turn }
        const { items } = cornerFigure(entering, { piece: leaving, closed }, options)
        const box = { minX: 0, minY: 0, maxX: frame.width, maxY: frame.height }
        expect(items.filter((item) => !holds(box, extentOf(item)))).toEqual([])
      }),
      { seed: 20_260_801, numRuns: 100 },
    )
  })

  it('sets off the cut from paint of its own color', () => {
    const { figure } = cornerOf(entering, leaving)
    const order = figure.items.map(({ role }) => role)
    order.forEach((role, index) => {
      if (role === 'metal') expect(order[index - 1]).toBe('halo')
    })
  })

  it('is the same drawing for the same pieces', () => {
    expect(cornerOf(entering, leaving).figure).toEqual(cornerOf(entering, leaving).figure)
  })
})

/** Two pieces of a named case of tests/cases/ends. */
const caseOf = (name: string): [EndOfPiece, EndOfPiece] => {
  const file = new URL(`../../cases/ends/${name}/input.json`, import.meta.url)
  const piece = z.object({ profile: profileSchema, end: endSchema, side: sideSchema })
  const stock = z.object({ thickness: z.number(), insideRadius: z.number(), kFactor: z.number() })
  const given = z
    .object({ stock, a: piece, b: piece })
    .parse(JSON.parse(readFileSync(file, 'utf8')))
  return [
    { ...given.a, sheet: given.stock },
    { ...given.b, sheet: given.stock },
  ]
}

describe('a gable and a plumb-faced high-side piece, leg by leg', () => {
  it('is drawn closed where the level face is the gable face / cos(a)', () => {
    const { closed, figure } = cornerOf(...caseOf('gable-and-plumb-faced-high-side-close'))
    expect(closed.closes).toBe(true)
    expect(paths(figure, 'problem')).toEqual([])
    expect(paths(figure, 'metal')).toHaveLength(4)
  })

  it('is drawn with the step between the lower edges where the faces are alike', () => {
    const { figure } = cornerOf(...caseOf('gable-and-high-side-with-faces-alike-leave-a-step'))
    // The roof legs close, the faces do not.
    expect(paths(figure, 'problem')).toHaveLength(2)
    expect(paths(figure, 'metal')).toHaveLength(2)
  })
})

/** Four-sided flat faces that touch along edges at most: the sides of boxes that stand apart. */
const boxArbitrary = fc
  .array(
    fc.record({ size: fc.tuple(fc.integer({ min: 1, max: 3 }), fc.integer({ min: 1, max: 3 })) }),
    { minLength: 1, maxLength: 4 },
  )
  .map((boxes) =>
    boxes.flatMap(({ size: [wide, tall] }, index): Face[] => {
      const at = vector3(5 * (index % 2), 5 * Math.floor(index / 2), 0)
      const corner = (x: number, y: number, z: number) =>
        add3(at, vector3(x * wide, y * wide, z * tall))
      return [
        [corner(0, 0, 0), corner(1, 0, 0), corner(1, 0, 1), corner(0, 0, 1)],
        [corner(0, 1, 0), corner(1, 1, 0), corner(1, 1, 1), corner(0, 1, 1)],
        [corner(0, 0, 0), corner(0, 1, 0), corner(0, 1, 1), corner(0, 0, 1)],
        [corner(1, 0, 0), corner(1, 1, 0), corner(1, 1, 1), corner(1, 0, 1)],
        [corner(0, 0, 1), corner(1, 0, 1), corner(1, 1, 1), corner(0, 1, 1)],
      ].map(faceOf)
    }),
  )

/** Where a line of sight through a point of the picture meets a face; undefined where it misses. */
const depthOf = (face: Face, x: number, y: number, view: ReturnType<typeof viewFrom>) => {
  const eye = add3(scale3(view.right, x), scale3(view.up, y))
  const [first] = face.corners
  const slant = dot3(face.normal, view.toEye)
  if (first === undefined || Math.abs(slant) < 1e-9) return undefined
  const depth = dot3(subtract3(first, eye), face.normal) / slant
  const hit = add3(eye, scale3(view.toEye, depth))
  const normal = unit3(face.normal)
  const inside = face.corners.every((corner, index) => {
    const next = face.corners[(index + 1) % face.corners.length] ?? corner
    return dot3(cross3(subtract3(next, corner), subtract3(hit, corner)), normal) > 1e-6
  })
  return inside ? depth : undefined
}

it("the painter's order shows at every point the face that lies nearest", () => {
  fc.assert(
    fc.property(
      boxArbitrary,
      fc.integer({ min: 0, max: 359 }),
      fc.integer({ min: 5, max: 80 }),
      fc.array(fc.tuple(fc.double({ min: 0, max: 1 }), fc.double({ min: 0, max: 1 })), {
        minLength: 30,
        maxLength: 30,
      }),
      (faces, azimuth, elevation, places) => {
        const view = viewFrom(azimuth + 0.5, elevation)
        const order = paintersOrder(faces, view)
        expect(order).toHaveLength(faces.length)
        const flat = faces.flatMap(({ corners }) => corners.map((corner) => project(corner, view)))
        const [xs, ys] = [flat.map(({ x }) => x), flat.map(({ y }) => y)]
        const within = (values: number[], part: number) =>
          Math.min(...values) + part * (Math.max(...values) - Math.min(...values))
        for (const [right, up] of places) {
          const hits = order.flatMap(
            (face) => depthOf(face, within(xs, right), within(ys, up), view) ?? [],
          )
          const shown = hits.at(-1)
          if (shown !== undefined) expect(shown).toBeCloseTo(Math.max(...hits), 6)
        }
      },
    ),
    { numRuns: 300 },
  )
})
