import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { Button } from '@/components/Button'
import { Choice } from '@/components/Choice'
import type { Run } from '../model/corner-presets'
import type { DraftEnd, DraftEnds } from '../model/draft-end'
import {
  BOTH_SQUARE,
  copiedMirrored,
  endsToKeep,
  layOf,
  otherSide,
  withEnd,
} from '../model/end-edits'
import { outerEdge, usualLay } from '../model/lay-presets'
import { useEndWords } from '../useEndWords'
import { useNeighbor } from '../useNeighbor'
import { useShownEnd } from '../useShownEnd'
import { CornerPicture } from './CornerPicture'
import { EndForm } from './EndForm'
import { EndMarks } from './EndMarks'
import { EndOutline } from './EndOutline'
import type { EndsPanelProps } from './EndsPanel'
import { MeetsHere } from './MeetsHere'

interface Props extends Omit<EndsPanelProps, 'ends'> {
  readonly ends: DraftEnds
  readonly side: Side
  readonly run: Run
  readonly onWrite: (ends: DraftEnds) => void
}

/** What is focused is scrolled to below the picture that stays above it. */
const CLEAR_OF_PICTURE = 'max-lg:[&_:is(input,select,button,summary)]:scroll-mt-60'

/**
 * One end: its form, and beside it how it will be. On a narrow screen the corner stays in sight
 * above the form while it is scrolled.
 */
export function OneEnd({ ends, side, run, onWrite, ...line }: Props) {
  const { lineKey, mark, profile, stock, strip, check, hands, lines, disabled } = line
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const { own, layout, other, mirrored, setMirrored } = useShownEnd({
    ...line,
    sheet: stock.sheet,
    side,
  })
  const meeting = useNeighbor(own, lines)
  const lay = layOf(ends)
  const dressed = ends[side]
  const isDressed = endsToKeep({ ...BOTH_SQUARE, [side]: dressed }) !== null
  const copied = copiedMirrored(ends, side)

  function change(end: DraftEnd) {
    const beside = ends[otherSide(side)]
    // The piece lies one way, whichever end was dressed first.
    const laid = end.kind === 'miter' && beside.kind === 'miter' ? { ...end, lay: beside.lay } : end
    onWrite(withEnd(ends, side, laid))
  }

  return (
    <div className="flex flex-col gap-x-10 gap-y-6 lg:grid lg:grid-cols-[minmax(0,24rem)_minmax(0,1fr)] lg:grid-rows-[auto_1fr]">
      <div className="sticky top-0 z-10 bg-paper lg:static lg:col-start-2">
        {own ? (
          <CornerPicture own={own} mark={mark} stock={stock} meeting={meeting} />
        ) : (
          <p className="text-scribe">
            {t(check?.problems.length ? 'picture.faulty' : 'picture.open')}
          </p>
        )}
      </div>
      <div className={`${CLEAR_OF_PICTURE} lg:col-start-1 lg:row-span-2 lg:row-start-1`}>
        <EndForm
          end={dressed}
          side={side}
          profile={profile}
          run={run}
          lay={lay ?? usualLay(profile, run)}
          outer={outerEdge(profile, lay ?? usualLay(profile, run))}
          disabled={disabled}
          onChange={change}
        />
      </div>
      <div className={`${CLEAR_OF_PICTURE} flex min-w-0 flex-col gap-4 lg:col-start-2`}>
        {own?.end.kind === 'miter' && (
          <MeetsHere own={own} ownKey={lineKey} meeting={meeting} disabled={disabled} />
        )}
        {hands && other !== null && own && (
          <Choice
            legend={t('picture.hand')}
            value={mirrored ? 'other' : 'drawn'}
            options={[
              { value: 'drawn', label: words.hand(hands.drawn) },
              { value: 'other', label: words.hand(other) },
            ]}
            onChange={(which) => setMirrored(which === 'other')}
          />
        )}
        {layout && isDressed && (
          <>
            <EndOutline layout={layout} strip={strip} stock={stock} side={side} />
            <EndMarks end={layout[side]} strip={strip} />
          </>
        )}
        {!disabled && isDressed && (
          <Button
            className="self-start"
            disabled={copied === null}
            onClick={() => copied && onWrite(copied)}
          >
            {t(`copy.${side}`)}
          </Button>
        )}
      </div>
    </div>
  )
}
