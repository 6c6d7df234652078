import Complex from 'complex.js'
import type { Hem, Profile } from '#shared/profile/profile.schema'
import type { Sheet } from '#shared/stock/stock.schema'

/*
 * The folded piece once more, with complex numbers and from the words of the design alone: a point
 * is a number, a direction a unit number, a bend a product. Nothing of the kernel is used. Setbacks
 * are not looked up in a formula but found where the outside faces meet, leg 1 is walked first and
 * a hem at edge A is put on behind it.
 */

const I = new Complex(0, 1)

/** A turn of some degrees, as a factor. */
const turned = (degrees: number): Complex => new Complex({ abs: 1, arg: (degrees / 180) * Math.PI })

/** How far along `1` from the origin the line through `point` towards `towards` crosses a level. */
const crossingAt = (level: number, point: Complex, towards: Complex): number =>
  point.re + ((level - point.im) / towards.im) * towards.re

/** Arriving at the origin along `1`: the bend's center for a middle line of radius `radius`. */
const centerOf = (turn: number, radius: number): Complex => I.mul(Math.sign(turn) * radius)

/** Where the straight before a bend would meet the straight behind it, on a line `out` inches out. */
const meetingLength = (turn: number, middle: number, out: number): number => {
  const side = Math.sign(turn)
  const center = centerOf(turn, middle)
  const behind = center.sub(I.mul(side * (middle + out)).mul(turned(turn)))
  return crossingAt(-side * out, behind, turned(turn))
}

/** What the outside dimension reaches beyond the straight part. */
const reachOf = (turn: number, { insideRadius, thickness }: Sheet): number =>
  Math.abs(turn) <= 90
    ? meetingLength(turn, insideRadius + thickness / 2, thickness / 2)
    : // The outermost point of the outside arc, seen along the leg.
      centerOf(turn, insideRadius + thickness / 2).add(insideRadius + thickness).re

const hemRadius = (hem: Hem): number => (hem.style === 'closed' ? 0 : hem.gap / 2)

export interface ComplexStraight {
  readonly of: number | 'lipA' | 'lipB'
  readonly from: Complex
  readonly to: Complex
  readonly along: Complex
  readonly outsideFrom: Complex
  readonly outsideTo: Complex
}

export interface ComplexRound {
  readonly of: number | 'hemA' | 'hemB'
  readonly center: Complex
  readonly mid: Complex
  /** Where the middle lines meet; the middle of the arc where they as good as never do. */
  readonly corner: Complex
  /** Radius of the middle line. */
  readonly radius: number
  /** 1 to the left, -1 to the right. */
  readonly side: number
}

export interface ComplexSection {
  readonly straights: readonly ComplexStraight[]
  readonly rounds: readonly ComplexRound[]
}

/** A hem seen from the leg that it lies on: `out` points off the leg's end. */
const foldHem = (edge: 'A' | 'B', hem: Hem, end: Complex, along: Complex, sheet: Sheet) => {
  const out = edge === 'A' ? along.mul(-1) : along
  const inside = hemRadius(hem)
  const radius = inside + sheet.thickness / 2
  const center = end.add(I.mul(along).mul(hem.turn * radius))
  const near = center.mul(2).sub(end)
  const reach = inside + sheet.thickness
  const far = near.sub(out.mul(hem.length - reach))
  const mid = center.add(out.mul(radius))
  const [from, to] = edge === 'A' ? [far, near] : [near, far]
  const nearOutside = near.add(out.mul(reach))
  const straight: ComplexStraight = {
    of: `lip${edge}`,
    from,
    to,
    along: along.mul(-1),
    outsideFrom: edge === 'A' ? far : nearOutside,
    outsideTo: edge === 'A' ? nearOutside : far,
  }
  const round: ComplexRound = {
    of: `hem${edge}`,
    center,
    mid,
    corner: mid,
    radius,
    side: hem.turn,
  }
  return { straight, round }
}

/** Inches; leg 1 along `1`, its outside dimension begins at 0, a positive turn goes left. */
export const complexSection = (profile: Profile, sheet: Sheet): ComplexSection => {
  const { legs, bends, hemA, hemB } = profile
  const radius = sheet.insideRadius + sheet.thickness / 2
  const hemReach = (hem: Hem | null) => (hem ? hemRadius(hem) + sheet.thickness : 0)
  const straights: ComplexStraight[] = []
  const rounds: ComplexRound[] = []
  let outsideFrom = new Complex(0, 0)
  let along = new Complex(1, 0)
  let before = hemReach(hemA)
  legs.forEach((leg, index) => {
    const turn = bends[index]?.turn
    const after = turn === undefined ? hemReach(hemB) : reachOf(turn, sheet)
    const from = outsideFrom.add(along.mul(before))
    const outsideTo = outsideFrom.add(along.mul(leg))
    const to = outsideTo.sub(along.mul(after))
    straights.push({ of: index + 1, from, to, along, outsideFrom, outsideTo })
    if (turn === undefined) return
    const center = to.add(along.mul(centerOf(turn, radius)))
    const mid = center.add(to.sub(center).mul(turned(turn / 2)))
    const corner = Math.abs(turn) < 179 ? to.add(along.mul(meetingLength(turn, radius, 0))) : mid
    rounds.push({ of: index + 1, center, mid, corner, radius, side: Math.sign(turn) })
    const begins = center.add(to.sub(center).mul(turned(turn)))
    along = along.mul(turned(turn))
    outsideFrom = begins.sub(along.mul(after))
    before = after
  })
  const [first, last] = [straights[0], straights.at(-1)]
  if (first && hemA) {
    const { straight, round } = foldHem('A', hemA, first.from, first.along, sheet)
    straights.unshift(straight)
    rounds.unshift(round)
  }
  if (last && hemB) {
    const { straight, round } = foldHem('B', hemB, last.to, last.along, sheet)
    straights.push(straight)
    rounds.push(round)
  }
  return { straights, rounds }
}
