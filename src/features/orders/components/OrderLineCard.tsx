import { useId } from 'react'
import { useTranslation } from 'react-i18next'
import type { OrderLine } from '#shared/orders/order.schema'
import { ButtonLink } from '@/components/ButtonLink'
import { LinePriceView } from '@/features/prices/components/LinePriceView'
import { BendsLine } from './LineBends'
import { OverrideNote } from './OverrideNote'
import { LineEnds } from './LineEnds'
import { LineFacts } from './LineFacts'
import { LineFigure } from './LineFigure'
import { LineHead } from './LineHead'
import { LinePieces } from './LinePieces'
import { GirthDifference } from './StatedGirth'
import { StockName } from './StockName'

interface Props {
  readonly line: OrderLine
  /** The order waits for its release, at which its pieces come into being. */
  readonly unreleased: boolean
  /** Where a piece's history is; absent where the reader has no such page. */
  readonly piecePath?: (code: string) => string
  /** Where the line's strip sheet is. */
  readonly sheetPath: string
}

/** A line of an order that is in: the drawing as the shop has it, and how far its pieces are. */
export function OrderLineCard({ line, unreleased, piecePath, sheetPath }: Props) {
  const { t } = useTranslation('orders')
  const { t: drawing } = useTranslation('drawing')
  const id = useId()
  const { bendsOn, stock, strip, quantity, pieces } = line
  return (
    <article
      aria-labelledby={id}
      className="flex max-w-[59rem] flex-col gap-3 border-t-2 border-ink pt-4"
    >
      <LineHead
        id={id}
        mark={line.mark}
        name={line.name}
        quantity={quantity}
        hands={line.hands}
        length={line.length}
      />
      <div className="grid gap-x-10 gap-y-3 lg:grid-cols-[22.5rem_minmax(0,34rem)]">
        <LineFigure profile={line.profile} stock={stock} strip={strip} name={line.name} />
        <div className="flex flex-col gap-3">
          <LineFacts strip={strip} pieceWeight={line.pieceWeight} quantity={quantity} />
          <LinePriceView quote={line} />
          <StockName stock={stock} />
          <GirthDifference profile={line.profile} stated={line.statedGirth} />
          <LineEnds ends={line.ends} />
          <BendsLine
            good={bendsOn.length > 0}
            words={
              bendsOn.length > 0
                ? drawing('answer.bendsOn', { brakes: bendsOn.join(', ') })
                : drawing('answer.bendsNowhere')
            }
          />
          <ButtonLink variant="quiet" className="-mx-1.5 self-start px-1.5!" to={sheetPath}>
            {t('line.sheet')}
          </ButtonLink>
          {line.override && <OverrideNote override={line.override} />}
          {unreleased && <p className="text-small text-scribe">{t('line.noPieces')}</p>}
          {pieces.length > 0 && (
            <LinePieces pieces={pieces} quantity={quantity} piecePath={piecePath} />
          )}
        </div>
      </div>
    </article>
  )
}
