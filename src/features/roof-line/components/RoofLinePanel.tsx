import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { roofPieces } from '#shared/roof-line/roof-pieces'
import type { Stock } from '#shared/stock/stock.schema'
import { Button } from '@/components/Button'
import { BOTH_SQUARE } from '@/features/ends/model/end-edits'
import { checkEnds } from '@/features/ends/model/check-ends'
import type { DraftLine } from '@/features/orders/draft/order-draft'
import type { LineCheck, LineGround } from '@/features/orders/form/check-line'
import { newKey } from '@/lib/api/idempotency'
import { completeRoofLine, newRoofLine } from '../model/draft-roof-line'
import { extraOf, firstSide, NO_EXTRA } from '../model/line-ends'
import { longestPiece } from '../model/longest-piece'
import {
  linesOfRoofLine,
  outsideEnds,
  pieceGroups,
  withRoofLine,
  type OutsideExtras,
} from '../model/use-pieces'
import { RoofLineAnswer } from './RoofLineAnswer'
import { RoofLineFields } from './RoofLineFields'
import { RoofLineProblems } from './RoofLineProblems'

interface Props {
  readonly line: DraftLine
  readonly lines: readonly DraftLine[]
  readonly stock: Stock
  readonly checked: LineCheck
  readonly ground: LineGround
  readonly disabled: boolean
  /** The draft's lines with the roof line covered. */
  readonly onUse: (lines: DraftLine[]) => void
}

/** What the outer ends add, by the layout they have on a piece of the line. */
function useOutside(
  line: DraftLine,
  lines: readonly DraftLine[],
  { check, profile }: LineCheck,
  stock: Stock,
) {
  const group = linesOfRoofLine(line, lines)
  const ends = outsideEnds(group)
  const layout = check?.strip
    ? checkEnds(ends, profile, stock.sheet, line.length ?? stock.longestPiece).layout
    : null
  const first = firstSide(ends.lowEnd)
  const at = (side: 'left' | 'right') => (layout ? extraOf(layout[side]) : NO_EXTRA)
  return {
    ends,
    extras: {
      first: at(first),
      last: at(first === 'left' ? 'right' : 'left'),
    } satisfies OutsideExtras,
    /** The ends cannot be laid out, so nothing is known of what they add. */
    unknown: layout === null && JSON.stringify(ends) !== JSON.stringify(BOTH_SQUARE),
  }
}

/** Splits a line on the roof into pieces and laps, and puts them into the order. */
export function RoofLinePanel({ line, lines, stock, checked, ground, disabled, onUse }: Props) {
  const { t } = useTranslation('roof-line')
  const longest = longestPiece(stock, ground.brakes, checked.plans)
  const [draft, setDraft] = useState(
    () => line.covers?.line ?? newRoofLine(ground.pitchRise, longest.length),
  )
  const outside = useOutside(line, lines, checked, stock)
  const added = (extra: OutsideExtras['first']) => extra.tab + (draft.toTips ? 0 : extra.point)
  const roofLine = completeRoofLine(draft, {
    first: added(outside.extras.first),
    last: added(outside.extras.last),
  })
  const tooLong = draft.pieceLength !== null && draft.pieceLength > longest.length
  const answer = roofLine && !tooLong ? roofPieces(roofLine) : null
  const groups =
    answer?.ok && roofLine
      ? pieceGroups(answer.answer, roofLine, outside.ends, outside.extras, draft.dressLaps)
      : []

  return (
    <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)]">
      <RoofLineFields
        draft={draft}
        longest={longest}
        tooLong={tooLong}
        extras={outside.extras}
        disabled={disabled}
        onChange={(patch) => setDraft({ ...draft, ...patch })}
      />
      <div className="flex flex-col gap-4">
        {outside.unknown && <p className="text-chalk">{t('endsUnknown')}</p>}
        {answer === null && <p className="text-scribe">{t('empty')}</p>}
        {answer && !answer.ok && <RoofLineProblems problems={answer.problems} />}
        {answer?.ok && roofLine && (
          <>
            <RoofLineAnswer
              answer={answer.answer}
              groups={groups}
              metal={stock.sheet.metal}
              lowEnd={outside.ends.lowEnd}
              pair={line.hands !== null && line.hands.left !== 0 && line.hands.right !== 0}
            />
            <Button
              className="self-start"
              disabled={disabled}
              onClick={() => onUse(withRoofLine(lines, line, groups, draft, newKey))}
            >
              {groups.length > 1 ? t('useMore', { count: groups.length }) : t('use')}
            </Button>
          </>
        )}
      </div>
    </div>
  )
}
