import { useMemo } from 'react'
import { useTranslation } from 'react-i18next'
import type { Side } from '#shared/ends/end.schema'
import { longestPieceMovement } from '#shared/roof-line/roof-movement'
import type { RoofPieces } from '#shared/roof-line/roof-pieces'
import type { Metal } from '#shared/stock/stock.schema'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors } from '@/features/drawing/figure/useFigureLook'
import { endsToKeep } from '@/features/ends/model/end-edits'
import { useEndWords } from '@/features/ends/useEndWords'
import { useUnits } from '@/features/people/useUnits'
import { roofLineFigure } from '../model/roof-line-figure'
import type { PieceGroup } from '../model/use-pieces'

interface Props {
  readonly answer: RoofPieces
  readonly groups: readonly PieceGroup[]
  readonly metal: Metal
  readonly lowEnd: Side | null
  /** Every piece is made left and right. */
  readonly pair: boolean
}

/** The pieces of a line, where each lap falls, and what the ends add: drawn and in words. */
export function RoofLineAnswer({ answer, groups, metal, lowEnd, pair }: Props) {
  const { t } = useTranslation('roof-line')
  const words = useEndWords()
  const { run, size } = useUnits()
  const { length, extras, laps, order, notes } = answer
  const begin = lowEnd === null ? 'left' : 'low'
  return (
    <div className="flex flex-col gap-3">
      <p className="font-figure text-lead">
        {t('answer.total', { count: order.length, length: run(length) })}
      </p>
      <LinePicture answer={answer} />
      <ul className="divide-y divide-rule border-y border-rule">
        {groups.map((group, index) => {
          const ends = endsToKeep(group.ends)
          return (
            <li key={index} className="flex flex-wrap items-baseline gap-x-4 py-2">
              <span className="font-figure whitespace-nowrap">
                {group.count} × {run(group.length)}
              </span>
              <span className="text-small text-scribe">{words.ends(ends)}</span>
            </li>
          )
        })}
      </ul>
      {pair && <p>{t('answer.pair', { count: order.length })}</p>}
      {laps.length > 0 && (
        <p>
          {t(`answer.laps.${begin}`, { count: laps.length })}{' '}
          <span className="font-figure">{laps.map(run).join(' · ')}</span>
        </p>
      )}
      {(extras.left > 0 || extras.right > 0) && (
        <p>{t(`answer.extras.${begin}`, { first: size(extras.left), last: size(extras.right) })}</p>
      )}
      {notes.map((note) => (
        <p key={note} className="text-ochre">
          {t(`note.${note}`)}
        </p>
      ))}
      <p className="text-small text-scribe">
        {t('answer.movement', { movement: size(longestPieceMovement(answer, metal), 32) })}
      </p>
    </div>
  )
}

/** As wide as a phone's column; it shrinks with anything narrower. */
const WIDTH = 358

function LinePicture({ answer }: { readonly answer: RoofPieces }) {
  const { t } = useTranslation('roof-line')
  const { run } = useUnits()
  const colors = useFigureColors(null)
  const figure = useMemo(() => roofLineFigure(answer, WIDTH, { length: run }), [answer, run])
  return (
    <SvgFigure
      display={figure}
      colors={colors}
      title={t('answer.picture', {
        pieces: answer.order.map((piece) => run(piece.length)).join(', '),
        laps: answer.laps.map(run).join(', '),
      })}
      className="h-auto max-w-full"
    />
  )
}
