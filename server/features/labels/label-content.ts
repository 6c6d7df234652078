import { inkColors } from '#shared/drawing/figure-colors'
import { sectionFigure } from '#shared/drawing/section-figure'
import type { DisplayList } from '#shared/drawing/display-list'
import { liftOf, type Lift } from '#shared/bundles/lift-rule'
import type { Side } from '#shared/ends/end.schema'
import { orderNumber } from '#shared/orders/order.schema'
import type { Units } from '#shared/people/people.contract'
import { pieceMark } from '#shared/pieces/piece-mark'
import type { ColorSide, Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { printRun } from '#shared/units/print-length'
import { printWeight } from '#shared/units/weight'

/** What is known of a piece that gets a label. Inches and pounds. */
export interface LabelFacts {
  readonly code: string
  readonly mark: string
  readonly sequence: number
  readonly quantity: number
  readonly name: string
  readonly profile: Profile
  readonly stock: Stock
  readonly length: number
  readonly weight: number
  /** By the piece's own hand. */
  readonly hand: Side | null
  readonly lowEnd: Side | null
  readonly orderNumber: number
  readonly poNumber: string
  readonly company: string
  readonly job: string
}

/** What stands on a label, in the units of the person who prints it. */
export interface LabelContent {
  readonly code: string
  /** Without its hand, which stands apart. */
  readonly mark: string
  readonly name: string
  readonly sequence: number
  readonly quantity: number
  readonly hand: Side | null
  /** Which end of the label's arrow is the low one, edge A below the label. */
  readonly lowEnd: Side | null
  readonly length: string
  readonly thickness: string
  readonly color: string
  readonly weight: string
  readonly lift: Lift
  readonly order: string
  readonly poNumber: string
  readonly company: string
  readonly job: string
  readonly section: DisplayList
}

/** Points. */
export const SECTION_SIZE = { width: 104, height: 64 }

/** On a label nothing is told by color. */
export const LABEL_COLORS = inkColors()

/**
 * The label is stuck on the bare side. Where that is the right side, who reads it looks at the piece
 * from below: with edge A nearest as ever, its left end lies to the right.
 */
const lowEndOnLabel = (lowEnd: Side | null, colorSide: ColorSide): Side | null => {
  if (lowEnd === null || colorSide !== 'left') return lowEnd
  return lowEnd === 'left' ? 'right' : 'left'
}

/** The section as it stands on a label: shape, hems, color side, edges lettered; no dimensions. */
export const labelSection = ({ profile, stock }: Pick<LabelFacts, 'profile' | 'stock'>) =>
  sectionFigure(profile, stock.sheet, {
    ...SECTION_SIZE,
    labels: { length: String, angle: String },
    show: { dimensions: false, angles: false, edges: true },
    textSize: 7.5,
  }).display

export function labelContent(facts: LabelFacts, units: Units, section: DisplayList): LabelContent {
  const { code, name, sequence, quantity, hand, stock, length, weight, company, job } = facts
  return {
    code,
    name,
    sequence,
    quantity,
    hand,
    company,
    job,
    section,
    mark: pieceMark({ ...facts, hand: null }),
    lowEnd: lowEndOnLabel(facts.lowEnd, facts.profile.colorSide),
    length: printRun(length, units),
    thickness: stock.thicknessName,
    color: stock.colorName,
    weight: printWeight(weight, units),
    lift: liftOf({ weight, longest: length }),
    order: orderNumber(facts.orderNumber),
    poNumber: facts.poNumber,
  }
}
