import { useMemo, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { cornerFigure } from '#shared/drawing/corner-figure'
import type { EndOfPiece } from '#shared/ends/folded-end'
import type { Stock } from '#shared/stock/stock.schema'
import { Icon } from '@/components/Icon'
import { IconButton } from '@/components/IconButton'
import { SvgFigure } from '@/features/drawing/figure/SvgFigure'
import { useFigureColors } from '@/features/drawing/figure/useFigureLook'
import { useEndWords } from '../useEndWords'
import type { Met } from '../useNeighbor'

interface Props {
  readonly own: EndOfPiece
  readonly mark: string
  readonly stock: Stock
  readonly meeting: Met
}

/** As wide as a phone's column; it shrinks with anything narrower. */
const WIDTH = 358
const HEIGHT = 210
/** Degrees that a press turns the corner under the eye. */
const TURNS = [
  { way: 'left', by: -30, place: 'left-0' },
  { way: 'right', by: 30, place: 'right-0' },
] as const

/** The end folded, with the piece that meets it: the corner as it will stand on the roof. */
export function CornerPicture({ own, mark, stock, meeting: { met, closed } }: Props) {
  const { t } = useTranslation('ends')
  const words = useEndWords()
  const colors = useFigureColors(stock.painted ? stock.colorHex : null)
  const [turn, setTurn] = useState(0)
  const partner = useMemo(
    () =>
      met && closed?.ok
        ? {
            piece: {
              profile: met.line.profile,
              sheet: met.line.sheet,
              end: met.end,
              side: met.side,
            },
            closed,
          }
        : null,
    [met, closed],
  )
  const display = useMemo(
    () =>
      cornerFigure(own, partner, {
        width: WIDTH,
        height: HEIGHT,
        names: [mark, met?.line.mark ?? ''],
        turn,
      }),
    [own, partner, mark, met, turn],
  )
  const side = words.side(own.side)
  return (
    <figure className="relative max-w-[22.5rem]">
      <SvgFigure
        display={display}
        colors={colors}
        title={
          partner && met
            ? t('picture.cornerWith', { side, mark, other: met.line.mark })
            : t('picture.corner', { side, mark })
        }
        className="h-auto max-w-full"
      />
      {TURNS.map(({ way, by, place }) => (
        <IconButton
          key={way}
          label={t(`picture.turn.${way}`)}
          icon={<Icon name="back" className={by > 0 ? 'size-5 rotate-180' : 'size-5'} />}
          className={`absolute bottom-0 ${place}`}
          onClick={() => setTurn(turn + by)}
        />
      ))}
    </figure>
  )
}
