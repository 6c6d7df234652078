import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import { openTools, toolClearance } from '#shared/bend-plan/collision/open-tools'
import type { Outline } from '#shared/bend-plan/collision/outline'
import { cutStart } from '#shared/bend-plan/collision/outline'
import { DEMO_BRAKE } from '#shared/bend-plan/demo-brakes'
import type { Contact } from '#shared/bend-plan/explain/contact.schema'
import { planSection } from '#shared/bend-plan/plan-profile'
import type { PlanReason } from '#shared/bend-plan/plan.schema'
import type { PlanRequest } from '#shared/bend-plan/planner'
import { rotate, vector } from '#shared/geometry/vector'
import type { Vector } from '#shared/geometry/vector'
import { KNOWN_PLANS } from '../../../support/known-bend-plans'
import {
  CASES,
  anyHemOrder,
  request,
  requestArbitrary,
  section,
} from '../../../support/bend-plan-cases'

vi.setConfig({ testTimeout: 60_000 })

type Segment = readonly [Vector, Vector]

const toSegment = (p: Vector, [a, b]: Segment): number => {
  const [dx, dy] = [b.x - a.x, b.y - a.y]
  const along = Math.max(
    0,
    Math.min(1, ((p.x - a.x) * dx + (p.y - a.y) * dy) / (dx * dx + dy * dy)),
  )
  return Math.hypot(p.x - a.x - along * dx, p.y - a.y - along * dy)
}

/** Of segments that do not cross: an end is nearest. */
const apart = (one: readonly Segment[], other: readonly Segment[], skipFirst = false): number =>
  Math.min(
    ...one.flatMap((p, i) =>
      other.flatMap((q, j) =>
        skipFirst && i === 0 && j === 0
          ? []
          : [toSegment(p[0], q), toSegment(p[1], q), toSegment(q[0], p), toSegment(q[1], p)],
      ),
    ),
  )

const runOf = (points: readonly Vector[]): Segment[] =>
  points.slice(1).map((to, i) => [points[i] ?? to, to])

const sidesOf = ({ points }: Outline): Segment[] =>
  points.map((from, i) => [from, points[(i + 1) % points.length] ?? from])

/** Back in the fold frame, where every front swings up. */
const framed = ({ direction, rear, front, at }: Contact) => {
  const flip = direction === 'up' ? 1 : -1
  const points = (of: readonly [number, number][]) => of.map(([x, y]) => vector(x, y * flip))
  return { rear: points(rear), front: points(front), at: vector(at[0], at[1] * flip) }
}

const toolsOf = ({ brake, sheet }: PlanRequest, { direction }: Contact) => {
  const clearance = toolClearance(sheet.thickness, brake)
  const set = direction === 'up' ? brake.up : brake.down
  if (set === null) throw new Error('A contact with tools that the brake does not have')
  return { clearance, tools: openTools(set, clearance) }
}

const checked = { met: 0, buried: 0, caught: 0 }

const expectExact = (asked: PlanRequest, { code }: PlanReason, contact: Contact) => {
  const { clearance, tools } = toolsOf(asked, contact)
  const { rear, front, at } = framed(contact)
  if (code === 'cannotLoad' || code === 'trapped') {
    // Caught on its way out: the place is one of the piece, or would be after the move.
    checked.caught += 1
    expect(
      Math.min(...[...runOf(rear), ...runOf(front)].map((run) => toSegment(at, run))),
    ).toBeLessThan(1e-6)
    return
  }
  const limit = contact.against === 'piece' ? asked.sheet.thickness : clearance
  const swings = code === 'apronMeetsRear' ? rear : front
  const other = (): Segment[] => {
    switch (contact.against) {
      case 'piece':
        return runOf(rear)
      case 'apron':
        return sidesOf(tools.apron).map(([a, b]) =>
          code === 'apronMeetsRear' ? [rotate(a, contact.swung), rotate(b, contact.swung)] : [a, b],
        )
      default:
        return sidesOf(tools[contact.against])
    }
  }
  const mark = Math.min(...other().map((side) => toSegment(at, side)))
  if (contact.swung === 0) {
    // In the way from the start: the mark is where, walking outwards, it first is. The end of the nose
    // zone may be in the way itself.
    checked.buried += 1
    if (code === 'frontMeetsTool') expect(mark).toBeLessThan(limit + 1e-6)
    else expect(Math.abs(mark - limit)).toBeLessThan(1e-6)
    return
  }
  checked.met += 1
  const sheet = code === 'frontMeetsTool' ? (cutStart(swings, asked.brake.noseZone) ?? []) : swings
  const found = apart(runOf(sheet), other(), contact.against === 'piece')
  expect(Math.abs(found - limit)).toBeLessThan(1e-6)
  if (contact.against !== 'piece') expect(Math.abs(mark - limit)).toBeLessThan(1e-6)
}

const CONTACTS = new Set<PlanReason['code']>([
  'rearMeetsTool',
  'frontMeetsTool',
  'meetsItself',
  'apronMeetsRear',
  'cannotLoad',
  'trapped',
])

const expectContacts = (asked: PlanRequest) => {
  for (const reason of planSection(asked).reasons) {
    expect(reason.contact !== null).toBe(CONTACTS.has(reason.code))
    if (reason.contact !== null) expectExact(asked, reason, reason.contact)
  }
}

describe('the picture at first contact', () => {
  test('shows the clearance and no less, on random pieces that cannot be bent', () => {
    fc.assert(fc.property(requestArbitrary(6), expectContacts), { ...CASES, numRuns: 250 })
    for (const { section: of } of KNOWN_PLANS) {
      for (const brake of Object.values(DEMO_BRAKE)) expectContacts(request(of, anyHemOrder(brake)))
    }
    expect(checked.met).toBeGreaterThan(20)
    expect(checked.buried).toBeGreaterThan(20)
    expect(checked.caught).toBeGreaterThan(3)
  })

  test('of a tube that closes: the last side swings into the nose', () => {
    const tube = KNOWN_PLANS.find(({ name }) => name === 'closed tube')
    if (tube === undefined) throw new Error('No closed tube')
    const asked = request(tube.section, anyHemOrder(DEMO_BRAKE.site))
    const contact = planSection(asked).reasons.find(
      ({ code }) => code === 'frontMeetsTool',
    )?.contact
    expect(contact).toMatchObject({ direction: 'up', against: 'inner' })
    expect(contact?.swung).toBeGreaterThan(45)
    expect(contact?.swung).toBeLessThan(90)
    // The front keeps its lengths as it swings.
    const front = contact?.front ?? []
    const runs = front
      .slice(1)
      .map(([x, y], i) => Math.hypot(x - (front[i]?.[0] ?? 0), y - (front[i]?.[1] ?? 0)))
    expect(runs.reduce((sum, run) => sum + run, 0)).toBeCloseTo(6.75, 9)
  })

  test('of a down fold hangs down', () => {
    const downOnly = { ...DEMO_BRAKE.upAndDown, gauge: null }
    const spiral = section([0.6, 1, 1.4, 1.8, 2.2, 2.6], [-90, -90, -90, -90, -90])
    const contacts = planSection(request(spiral, downOnly)).reasons.flatMap(
      ({ contact }) => contact ?? [],
    )
    expect(contacts.length).toBeGreaterThan(0)
    for (const { direction, leftUp, rear } of contacts) {
      // A bend to the right folds up with the right side up.
      expect(direction).toBe(leftUp ? 'down' : 'up')
      const lowest = Math.min(...rear.map(([, y]) => y))
      const highest = Math.max(...rear.map(([, y]) => y))
      expect(Math.abs(direction === 'up' ? lowest : highest)).toBeLessThan(1e-9)
    }
  })

  test('is not drawn where it is not asked for', () => {
    const tube = section([0.75, 2, 2, 2, 2], [90, 90, 90, 90])
    const { reasons, cures } = planSection({ ...request(tube, DEMO_BRAKE.upOnly), explain: false })
    expect(reasons.length).toBeGreaterThan(1)
    expect(reasons.every(({ overlap, contact }) => overlap === null && contact === null)).toBe(true)
    expect(cures).toEqual([])
  })
})
