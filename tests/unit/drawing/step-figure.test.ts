import { describe, expect, it } from 'vitest'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import { stepPictures } from '#shared/bend-plan/plan-pictures'
import { planBends } from '#shared/bend-plan/planner'
import { sectionOf } from '#shared/bend-plan/section'
import type { DisplayList } from '#shared/drawing/display-list'
import { moveFigure } from '#shared/drawing/move-figure'
import { GLYPH_SIZE, stateGlyph } from '#shared/drawing/state-glyphs'
import { stepFigure } from '#shared/drawing/step-figure'
import { boundsOf, holds } from '#shared/geometry/bounds'
import { PIECE_STATES } from '#shared/pieces/piece-state'
import { STEEL } from '../../support/arbitrary-profile'
import { extentOf } from './figure-faults'
import { NAMED_PROFILES } from './named-profiles'

const outside = (display: DisplayList): string[] => {
  const frame = {
    minX: -0.01,
    minY: -0.01,
    maxX: display.width + 0.01,
    maxY: display.height + 0.01,
  }
  return display.items
    .filter((item) => item.role !== 'toolEdge' && !holds(frame, extentOf(item)))
    .map((item) => `${item.role} ${item.kind} leaves the frame`)
}

const BRAKES = Object.values(DEMO_BRAKE).map((brake) => ({ ...brake, hemsFirst: false }))

const stepsOf = (name: string) => {
  const profile = NAMED_PROFILES[name]
  if (profile === undefined) throw new Error(`No profile ${name}.`)
  return BRAKES.flatMap((brake) => {
    const request = {
      section: sectionOf(profile, STEEL),
      sheet: STEEL,
      brake,
      pieceLength: 120,
      paintedSide: profile.colorSide,
    }
    const plan = planBends(request)
    const pictures = stepPictures(plan, request)
    return plan.steps.flatMap((step, index) => {
      const picture = pictures[index]
      if (picture === undefined) return []
      const tools = step.direction === 'up' ? brake.up : brake.down
      return { step, picture, tools }
    })
  })
}

describe.each(['gable', 'box eave', 'Z closure', 'box gutter', 'W valley'])(
  'steps of a %s',
  (name) => {
    const steps = stepsOf(name)

    it('stay in the frame, with both edges lettered', () => {
      expect(steps.length).toBeGreaterThan(2)
      for (const { step, picture, tools } of steps) {
        const display = stepFigure(picture, {
          width: 520,
          height: 360,
          direction: step.direction,
          tools,
        })
        expect(outside(display)).toEqual([])
        const letters = display.items.flatMap((item) => (item.kind === 'text' ? item.text : []))
        expect(letters.toSorted()).toEqual(['A', 'B'])
      }
    })

    it('show the front on its way thinner than where it starts', () => {
      for (const { step, picture, tools } of steps) {
        const display = stepFigure(picture, {
          width: 520,
          height: 360,
          direction: step.direction,
          tools,
        })
        const ghosts = display.items.flatMap((item) =>
          item.role === 'ghost' && item.kind === 'path' ? [item] : [],
        )
        const [thin, dashed] = [
          ghosts.filter(({ dash }) => !dash),
          ghosts.filter(({ dash }) => dash),
        ]
        expect(thin.length).toBeGreaterThanOrEqual(step.hits === 1 ? 2 : 1)
        const [start] = dashed
        expect(thin.every(({ width }) => width < (start?.width ?? 0))).toBe(true)
      }
    })

    it('show the finished front above the bend line when it swings up, below when down', () => {
      for (const { step, picture } of steps.filter(({ step: { hits } }) => hits === 1)) {
        const [, first] = picture.frontAfter
        expect(Math.sign(first?.y ?? 0)).toBe(step.direction === 'up' ? 1 : -1)
        const display = stepFigure(picture, {
          width: 520,
          height: 360,
          direction: step.direction,
          tools: null,
        })
        const arrow = display.items.find((item) => item.role === 'selected' && item.kind === 'path')
        const ghost = display.items.find((item) => item.role === 'ghost')
        if (arrow?.kind !== 'path' || ghost?.kind !== 'path') throw new Error('No swing was drawn.')
        const rise = (arrow.points[0]?.y ?? 0) - (arrow.points.at(-1)?.y ?? 0)
        if (Math.abs(step.angle) <= 90 && picture.frontBefore.length === 2) {
          expect(Math.sign(rise)).toBe(step.direction === 'up' ? 1 : -1)
        }
      }
    })
  },
)

describe('small pictures', () => {
  it.each(PIECE_STATES)('the glyph of %s fills its square and no more', (state) => {
    const display = stateGlyph(state)
    expect(outside(display)).toEqual([])
    const { minX, maxX } = boundsOf(
      display.items.flatMap((item) => {
        const box = extentOf(item)
        return [
          { x: box.minX, y: box.minY },
          { x: box.maxX, y: box.maxY },
        ]
      }),
    )
    expect(maxX - minX).toBeGreaterThan(GLYPH_SIZE * 0.6)
  })

  it('no two states look alike', () => {
    const drawings = PIECE_STATES.map((state) => JSON.stringify(stateGlyph(state)))
    expect(new Set(drawings).size).toBe(PIECE_STATES.length)
  })

  it.each(['load', 'none', 'roll', 'endForEnd', 'both'] as const)(
    'the move %s stays in its frame at any size',
    (move) => {
      for (const width of [32, 128]) expect(outside(moveFigure(move, width))).toEqual([])
    },
  )
})
