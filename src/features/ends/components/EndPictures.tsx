import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
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
import { useEndWords } from '../useEndWords'

interface Props {
  readonly profile: Profile
  readonly stock: Stock
  readonly strip: Strip
  readonly pieceLength: Inches
  readonly check: EndsCheck | null
  readonly side: Side
  readonly hands: DraftHands | null
}

/** One end as it will be: the corner, the strip's outline with its marks; of a pair either hand. */
export function EndPictures({ profile, stock, strip, pieceLength, check, side, hands }: Props) {
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const [mirror, setMirror] = useState(false)
  const other = otherHand(hands)
  const mirrored = mirror && other !== null
  if (!check?.ends || !check.layout) {
    return (
      <p className="text-scribe">{t(check?.problems.length ? 'picture.faulty' : 'picture.open')}</p>
    )
  }
  const ends = mirrored ? mirrorEnds(check.ends) : check.ends
  const layout = mirrored
    ? layComplete(ends, profile, stock.sheet, pieceLength).layout
    : check.layout
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
          onChange={(shown) => setMirror(shown === 'other')}
        />
      )}
      {layout && (
        <MarkTable end={layout[side]} strip={strip} caption={t(`marks.caption.${side}`)} />
      )}
    </div>
  )
}
