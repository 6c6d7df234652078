import type { ShopBrake } from '#shared/brakes/brakes.contract'
import { resolveFollows } from '#shared/profile/follows'
import { hasErrors } from '#shared/profile/problem'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import { pieceWeight } from '#shared/strip/weight'
import {
  checkDrawing,
  planOnBrakes,
  type CheckedPlan,
  type DrawingCheck,
} from '@/features/drawing/check/check-drawing'
import { checkEnds, type EndsCheck } from '@/features/ends/model/check-ends'
import type { DraftLine } from '../draft/order-draft'

/** Figures of a line whose length is still to be entered are those of a 10 ft piece. */
export const UNTIL_ENTERED = 120

/** What the lines of an order are checked against. */
export interface LineGround {
  readonly stocks: readonly Stock[]
  readonly brakes: readonly ShopBrake[]
  /** Rise in 12, for bends that follow the roof. */
  readonly pitchRise: number
}

export interface LineCheck {
  /** As the shop will make it: bends that follow the roof have their turn. */
  readonly profile: Profile
  /** The stock chosen; null until one is. */
  readonly stock: Stock | null
  /** What the figure is drawn in: the stock chosen, or the first of the shop. */
  readonly drawnIn: Stock | null
  /** Null where the shop has no stock at all. */
  readonly check: DrawingCheck | null
  readonly plans: readonly CheckedPlan[]
  /** Null while the drawing cannot be made. */
  readonly ends: EndsCheck | null
}

interface Remembered {
  readonly stock: Stock
  readonly brakes: readonly ShopBrake[]
  readonly answer: Pick<LineCheck, 'profile' | 'check' | 'plans'>
}

/** A drawing stays the same object while the other fields of its line are typed into. */
const remembered = new WeakMap<Profile, Map<string, Remembered>>()

function answerFor(
  drawn: Profile,
  stock: Stock,
  length: number,
  { brakes, pitchRise }: LineGround,
): Remembered['answer'] {
  const answers = remembered.get(drawn) ?? new Map<string, Remembered>()
  remembered.set(drawn, answers)
  const key = `${stock.id} ${length} ${pitchRise}`
  const known = answers.get(key)
  if (known?.stock === stock && known.brakes === brakes) return known.answer
  const profile = resolveFollows(drawn, pitchRise)
  const check = checkDrawing(profile, stock, length)
  const plans = hasErrors(check.problems) ? [] : planOnBrakes(profile, stock, length, brakes)
  const answer = { profile, check, plans }
  answers.set(key, { stock, brakes, answer })
  return answer
}

/** What of a line its drawing and its ends are checked by. */
export type CheckedLine = Pick<DraftLine, 'profile' | 'stockId' | 'length' | 'ends'>

/** A piece weighs what its blank does: tabs included, nothing cut away yet. */
function withTabs(
  check: DrawingCheck | null,
  ends: EndsCheck | null,
  { sheet }: Stock,
): DrawingCheck | null {
  if (!check?.strip || !ends?.layout) return check
  return { ...check, weight: pieceWeight(check.strip, sheet, ends.layout.blankLength) }
}

/** The same answer as on the drawing board, for one line of an order, and how its ends are cut. */
export function checkLine(line: CheckedLine, ground: LineGround): LineCheck {
  const { profile, stockId, length } = line
  const stock = ground.stocks.find(({ id }) => id === stockId) ?? null
  const drawnIn = stock ?? ground.stocks[0] ?? null
  if (!drawnIn) {
    return {
      profile: resolveFollows(profile, ground.pitchRise),
      stock,
      drawnIn,
      check: null,
      plans: [],
      ends: null,
    }
  }
  const pieceLength = length ?? UNTIL_ENTERED
  const answer = answerFor(profile, drawnIn, pieceLength, ground)
  // Without a strip there is nothing to cut ends on; the drawing says why.
  const ends = answer.check?.strip
    ? checkEnds(line.ends, answer.profile, drawnIn.sheet, pieceLength)
    : null
  return { stock, drawnIn, ...answer, check: withTabs(answer.check, ends, drawnIn), ends }
}

/** True when the drawing can be made but no brake of the shop bends it. */
export const bendsNowhere = ({ plans }: Pick<LineCheck, 'plans'>): boolean =>
  plans.length > 0 && plans.every(({ plan }) => !plan.feasible)
