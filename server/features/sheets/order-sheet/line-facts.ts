import { blankLength } from '#server/features/orders/line-strip'
import { endWords } from '#server/features/sheets/order-sheet/end-words'
import { figure, said, type Fact } from '#server/features/sheets/order-sheet/fact-list'
import type { OrderSpeech } from '#server/features/sheets/order-sheet/order-speech'
import type { PrintedLine } from '#server/features/sheets/order-sheet/printed-order'
import { isEqual } from '#shared/geometry/tolerance'
import { HAND_LETTERS } from '#shared/pieces/piece-mark'
import { girthDifference } from '#shared/profile/stated-girth'

const SIDES = ['left', 'right'] as const

/** What was ordered of a line, beside its figures. */
export function lineFacts(line: PrintedLine, speech: OrderSpeech): Fact[] {
  const { words, order, run, size, sheared, weight, count, money } = speech
  const { fact } = words
  const { hands, stock, strip, quantity, statedGirth, profile, pieceWeight, price } = line
  const blank = blankLength(line, stock.sheet)
  return [
    figure(fact.pieces, [count(quantity), handCounts(line)].filter(Boolean).join(': ')),
    ...(hands === null ? [] : [said(order.drawn, words.hand[hands.drawn])]),
    figure(fact.length, run(line.length)),
    ...(isEqual(blank, line.length) ? [] : [figure(fact.blank, run(blank))]),
    figure(fact.girth, size(strip.girth)),
    ...(statedGirth === null
      ? []
      : [
          {
            ...figure(fact.statedGirth, size(statedGirth)),
            odd: girthDifference(profile, statedGirth) !== 0,
          },
        ]),
    figure(fact.stripWidth, sheared(strip.stripWidth)),
    figure(fact.weight, weight(pieceWeight)),
    ...(quantity === 1 ? [] : [figure(order.weightOfAll, weight(pieceWeight * quantity))]),
    {
      ...said(
        fact.stock,
        order.stock(stock.colorName, stock.thicknessName, order.metal[stock.sheet.metal]),
      ),
      swatch: stock.colorHex,
    },
    said(fact.colorSide, words.colorSide[profile.colorSide]),
    said(order.ends.title, ...endWords(line.ends, speech)),
    ...(price === null ? [] : [figure(order.price, money(price.cents))]),
  ]
}

/** `2 L · 1 R`; empty where the pieces have no hand. */
const handCounts = ({ hands }: PrintedLine): string =>
  hands === null
    ? ''
    : SIDES.filter((side) => hands[side] > 0)
        .map((side) => `${hands[side]} ${HAND_LETTERS[side]}`)
        .join(' · ')
