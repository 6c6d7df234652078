import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import type { EndOfPiece } from '#shared/ends/folded-end'
import { mirrorEnds } from '#shared/ends/hands'
import type { Profile } from '#shared/profile/profile.schema'
import type { Stock } from '#shared/stock/stock.schema'
import type { Strip } from '#shared/strip/strip.schema'
import type { Inches } from '#shared/units/brands'
import { Choice } from '@/components/Choice'
import { MarkTable } from '@/features/strip-sheet/components/MarkTable'
import { layComplete, type EndsCheck } from '../model/check-ends'
import type { DraftHands } from '../model/draft-end'
import { otherHand } from '../model/hand-edits'
import type { EndedLine } from '../model/neighbors'
import { useEndWords } from '../useEndWords'
import { useNeighbor } from '../useNeighbor'
import { CornerPicture } from './CornerPicture'
import { EndOutline } from './EndOutline'
import { MeetsHere } from './MeetsHere'

interface Props {
  readonly lineKey: string
  readonly mark: string
  readonly profile: Profile
  readonly stock: Stock
  readonly strip: Strip
  readonly pieceLength: Inches
  readonly check: EndsCheck | null
  readonly side: Side
  readonly hands: DraftHands | null
  readonly lines: readonly EndedLine[]
  readonly disabled: boolean
}

/** One end as it will be: folded in its corner, and flat with its marks; of a pair either hand. */
export function EndPictures(props: Props) {
  const { profile, stock, strip, pieceLength, check, side, hands, mark, lines, disabled } = props
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const [mirror, setMirror] = useState(false)
  const other = otherHand(hands)
  const mirrored = mirror && other !== null
  const drawn = check?.ends ?? null
  const { sheet } = stock
  const shown = useMemo(() => {
    if (drawn === null) return null
    return layComplete(mirrored ? mirrorEnds(drawn) : drawn, profile, sheet, pieceLength)
  }, [drawn, mirrored, profile, sheet, pieceLength])
  const end = shown?.ends?.[side]
  const own = useMemo<EndOfPiece | null>(
    () => (end && shown?.layout ? { profile, sheet, end, side } : null),
    [end, shown, profile, sheet, side],
  )
  const meeting = useNeighbor(own, lines)
  if (!own || !shown?.layout) {
    return (
      <p className="text-scribe">{t(check?.problems.length ? 'picture.faulty' : 'picture.open')}</p>
    )
  }
  return (
    <div className="flex flex-col gap-4">
      {hands && other !== null && (
        <Choice
          legend={t('picture.hand')}
          value={mirrored ? 'other' : 'drawn'}
          options={[
            { value: 'drawn', label: words.hand(hands.drawn) },
            { value: 'other', label: words.hand(other) },
          ]}
          onChange={(which) => setMirror(which === 'other')}
        />
      )}
      <CornerPicture own={own} mark={mark} stock={stock} meeting={meeting} />
      {own.end.kind === 'miter' && (
        <MeetsHere own={own} ownKey={props.lineKey} meeting={meeting} disabled={disabled} />
      )}
      <EndOutline layout={shown.layout} strip={strip} stock={stock} side={side} />
      <MarkTable end={shown.layout[side]} strip={strip} caption={t(`marks.caption.${side}`)} />
    </div>
  )
}
